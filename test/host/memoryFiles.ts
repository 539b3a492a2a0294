import {
  EventEmitter,
  FileSystemError,
  FileType,
  type FileChangeEvent,
  type FileStat,
  type FileSystemProvider,
  type Uri,
} from 'vscode';

/** A read-only file system in memory: what a virtual workspace is to the extension. */
export class MemoryFiles implements FileSystemProvider {
  private readonly files = new Map<string, Uint8Array>();
  readonly onDidChangeFile = new EventEmitter<FileChangeEvent[]>().event;

  put(uri: Uri, text: string): void {
    this.files.set(uri.toString(), new TextEncoder().encode(text));
  }

  stat(uri: Uri): FileStat {
    return { type: FileType.File, ctime: 0, mtime: 1, size: this.readFile(uri).length };
  }

  readFile(uri: Uri): Uint8Array {
    const bytes = this.files.get(uri.toString());
    if (bytes === undefined) throw FileSystemError.FileNotFound(uri);
    return bytes;
  }

  watch() {
    return { dispose: () => undefined };
  }

  readDirectory(): [string, FileType][] {
    return [];
  }

  createDirectory = refuse;
  writeFile = refuse;
  delete = refuse;
  rename = refuse;
}

function refuse(): never {
  throw FileSystemError.NoPermissions('this file system is only read');
}
