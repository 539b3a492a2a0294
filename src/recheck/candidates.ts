import { Refusal } from '../core/model/problem';

/**
 * Where the file that a block names may stand, in the order in which to look, relative to the root: from the root itself,
 * then from the notebook's folder and each folder above it. Whoever opens one still resolves its links and refuses what
 * leaves the root by one.
 *
 * @param name as the block writes it: relative, '/' between folders
 * @param notebookFolder the folder of the notebook, relative to the root, '/' between folders; '' or '.' for the root
 * @throws Refusal file-outside-root for a name that is absolute or leads out of the root
 */
export function candidates(name: string, notebookFolder: string): readonly string[] {
  const inside = withoutDots(name.split('/'));
  // Both kinds of slash: what leads out of the root on one system must not be let through on another.
  const leadsOut = inside === null || withoutDots(name.split(/[/\\]/u)) === null;
  if (leadsOut || /^(?:[/\\]|[A-Za-z]:)/u.test(name)) throw new Refusal('file-outside-root', { name }, name);
  const folders = withoutDots(notebookFolder.split('/')) ?? [];
  const above = folders.map((_, index) => folders.slice(0, folders.length - index));
  return [[], ...above].map(folder => [...folder, ...inside].join('/'));
}

/** The parts of a path without '.' and '..'; null where it leads above its start. */
function withoutDots(parts: readonly string[]): readonly string[] | null {
  const kept: string[] = [];
  for (const part of parts) {
    if (part === '..' && kept.pop() === undefined) return null;
    if (!['..', '.', ''].includes(part)) kept.push(part);
  }
  return kept;
}
