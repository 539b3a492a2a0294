import { readdir, stat } from 'node:fs/promises';
import path from 'node:path';
import { refusePipe } from './regularFile';
import { UsageError } from './usageError';

const notebookNames = /\.(?:md|markdown|txt|qmd|rmd|tex|rst|adoc)$/i;
const passedOver = new Set(['node_modules', 'dist', 'coverage']);

/** A pattern as a shell has it: ** for any folders, * and ? inside a name, {a,b} for a choice. */
export function patternOf(glob: string): RegExp {
  let braces = 0;
  const source = glob.replace(/\*\*\/|\*\*|\*|\?|[{},]|[\\^$.|+()[\]]/g, mark => {
    if (mark === '**/') return '(?:[^/]+/)*';
    if (mark === '**') return '.*';
    if (mark === '*') return '[^/]*';
    if (mark === '?') return '[^/]';
    if (mark === '{') return (braces++, '(?:');
    if (mark === '}' && braces > 0) return (braces--, ')');
    if (mark === ',') return braces > 0 ? '|' : ',';
    return `\\${mark}`;
  });
  return new RegExp(`^${source}${')'.repeat(braces)}$`);
}

/** Every file under a folder, in order of name; hidden folders and those of packages and builds are passed over. */
async function filesUnder(folder: string): Promise<readonly string[]> {
  const entries = await readdir(folder, { withFileTypes: true });
  entries.sort((one, other) => (one.name < other.name ? -1 : 1));
  const found: string[] = [];
  for (const entry of entries) {
    const inside = path.join(folder, entry.name);
    if (entry.isDirectory() && !entry.name.startsWith('.') && !passedOver.has(entry.name)) {
      found.push(...(await filesUnder(inside)));
    } else if (entry.isFile()) found.push(inside);
  }
  return found;
}

async function fromGlob(glob: string, cwd: string): Promise<readonly string[]> {
  const parts = glob.split(/[/\\]/);
  const plain = parts.slice(
    0,
    parts.findIndex(part => /[*?{]/.test(part)),
  );
  const base = path.resolve(cwd, plain.join('/') || (glob.startsWith('/') ? '/' : '.'));
  const pattern = patternOf(parts.slice(plain.length).join('/'));
  const all = await filesUnder(base).catch(() => []);
  return all.filter(file => pattern.test(path.relative(base, file).split(path.sep).join('/')));
}

/**
 * The notebooks that files, folders and patterns name, each once, as absolute paths. A file that is named itself counts
 * whatever its name ends in. Throws a UsageError for a name that meets nothing.
 */
export async function findNotebooks(words: readonly string[], cwd: string): Promise<readonly string[]> {
  const found = new Set<string>();
  for (const word of words) {
    const absolute = path.resolve(cwd, word);
    await refusePipe(absolute, word);
    const kind = await stat(absolute).catch(() => null);
    const files =
      kind === null
        ? await fromGlob(word, cwd)
        : kind.isDirectory()
          ? (await filesUnder(absolute)).filter(file => notebookNames.test(file))
          : [absolute];
    if (files.length === 0) {
      throw new UsageError(
        kind === null ? `There is no file ${word}` : `There is no notebook in ${word}`,
        'Name notebooks, folders or patterns such as "notes/**/*.md".',
      );
    }
    for (const file of files) found.add(file);
  }
  return [...found];
}
