import { execFile } from 'node:child_process';
import path from 'node:path';
import * as vscode from 'vscode';
import type { TestApi } from '../../src/host/extension';

type Shown = NonNullable<ReturnType<TestApi['lastShown']>>;

/** The folder that the editor has open: a copy of the demo. */
export const workspaceUri = (): vscode.Uri => {
  const [folder] = vscode.workspace.workspaceFolders ?? [];
  if (folder === undefined) throw new Error('no folder is open');
  return folder.uri;
};

/** What the extension shows of itself under test. */
export async function weighbeam(): Promise<TestApi> {
  const extension = vscode.extensions.getExtension<TestApi>('weighbeam.weighbeam');
  if (extension === undefined) throw new Error('the extension is not there');
  return extension.activate();
}

/** Writes a file of the open folder. */
export async function write(name: string, text: string): Promise<vscode.Uri> {
  const uri = vscode.Uri.joinPath(workspaceUri(), name);
  await vscode.workspace.fs.writeFile(uri, new TextEncoder().encode(text));
  return uri;
}

export const read = async (uri: vscode.Uri): Promise<string> =>
  new TextDecoder().decode(await vscode.workspace.fs.readFile(uri));

/** Shows a file of the open folder in a text editor. */
export async function open(uri: vscode.Uri): Promise<vscode.TextEditor> {
  return vscode.window.showTextDocument(await vscode.workspace.openTextDocument(uri));
}

/** Waits for what the editor does a moment later. */
export async function until<T>(
  what: string,
  look: () => T | undefined | false | Promise<T | undefined | false>,
): Promise<T> {
  for (const deadline = Date.now() + 15_000; ;) {
    const found = await look();
    if (found !== undefined && found !== false) return found;
    if (Date.now() > deadline) throw new Error(`waited in vain: ${what}`);
    await new Promise(resolve => setTimeout(resolve, 50));
  }
}

/** Titles of the comparison panels that are open. */
export const panels = (): readonly string[] =>
  vscode.window.tabGroups.all
    .flatMap(group => group.tabs)
    .filter(
      tab =>
        tab.input instanceof vscode.TabInputWebview && tab.input.viewType.includes('weighbeam.comparison'),
    )
    .map(tab => tab.label);

/** Compares without a question asked, as another program would; gives what the panel then shows. */
export async function compare(uri: vscode.Uri, request: object): Promise<Shown> {
  const api = await weighbeam();
  await vscode.commands.executeCommand('weighbeam.compare', uri, request);
  const shown = api.lastShown();
  if (shown === null) throw new Error('nothing is shown');
  return shown;
}

/** Starts the command and waits for its first question; gives what stands over it. Escape ends the command. */
export async function takenBy(...args: readonly unknown[]): Promise<string> {
  const api = await weighbeam();
  const running = Promise.resolve(vscode.commands.executeCommand('weighbeam.compare', ...args));
  const { title } = await until('a question is open', () => api.openStep() ?? undefined);
  await escape(running);
  return title;
}

/** Presses Escape until the command has ended. */
export async function escape(running: Promise<unknown>): Promise<void> {
  let ended = false;
  void running.then(() => (ended = true));
  await until('the command has ended', async () => {
    await vscode.commands.executeCommand('workbench.action.closeQuickOpen');
    return ended;
  });
}

/** Runs the command and takes the answer under the cursor of every question; gives what the panel then shows. */
export async function compareByEnter(...args: readonly unknown[]): Promise<Shown> {
  const api = await weighbeam();
  const before = api.lastShown();
  let ended = false;
  const running = Promise.resolve(vscode.commands.executeCommand('weighbeam.compare', ...args)).then(() => {
    ended = true;
  });
  await until('the last question is answered', async () => {
    await vscode.commands.executeCommand('workbench.action.acceptSelectedQuickOpenItem');
    return ended;
  });
  await running;
  const shown = api.lastShown();
  if (shown === null || shown === before) throw new Error('nothing new is shown');
  return shown;
}

/** What the command line of the same build gives, run in the open folder. */
export function commandLine(
  ...args: readonly string[]
): Promise<{ readonly code: number; readonly output: string }> {
  const program = path.join(process.env['WEIGHBEAM_ROOT'] ?? '', 'dist', 'cli.js');
  const env = { ...process.env, ELECTRON_RUN_AS_NODE: '1' };
  return new Promise(resolve => {
    execFile(
      process.execPath,
      [program, ...args],
      { cwd: workspaceUri().fsPath, env },
      (error, stdout, stderr) =>
        resolve({ code: error === null ? 0 : Number(error.code), output: stdout === '' ? stderr : stdout }),
    );
  });
}

export async function closeAll(): Promise<void> {
  await vscode.commands.executeCommand('workbench.action.closeQuickOpen');
  await vscode.commands.executeCommand('workbench.action.closeAllEditors');
  await until('all editors are closed', () =>
    vscode.window.tabGroups.all.every(group => group.tabs.length === 0),
  );
}
