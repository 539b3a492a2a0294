import type { Request } from '../../compare/request';
import { readRequest } from '../../protocol/request';
import { askComparison } from '../asking/askComparison';
import { RefusedError } from '../compute/computeClient';
import { recordName, rootOf } from '../files/root';
import type { Host } from '../host';
import { chooseFile } from '../selecting/chooseFile';
import { targetsOf, type Targets } from '../selecting/targets';
import { settingsFor } from '../settingsFor';
import type { Command } from './command';

/**
 * Compares groups: of the active editor, of a file clicked in a menu, of two files (one group each), or, for other
 * programs, `executeCommand('weighbeam.compare', uri, request)` without a question asked.
 */
export const compare = (host: Host): Command => ({
  id: 'weighbeam.compare',
  async execute(first, second) {
    const given = isRequest(second) ? readRequest(second) : null;
    const targets = targetsOf(first, given === null ? second : undefined) ?? (await chosen());
    const main = targets?.files[0];
    if (targets === null || main === undefined) return;
    const { files } = targets;
    const root = rootOf(main);
    const base: Request = { files: files.map(uri => recordName(uri, root)), ...settingsFor(main) };
    const { request, spans } =
      given === null
        ? await asked(host, targets, base)
        : { request: { ...base, ...given, files: base.files }, spans: [] };
    await host.panels.show({ files, root, spans }, request);
  },
});

/** The editor's menus hand on where they were opened; anything else that is a plain object is a request. */
const isRequest = (value: unknown): boolean =>
  typeof value === 'object' && value !== null && !Array.isArray(value) && !('groupId' in value);

async function chosen(): Promise<Targets | null> {
  const uri = await chooseFile();
  return uri === null ? null : { files: [uri], spans: [] };
}

/** What was asked; where the file cannot be read, what is known: the panel then says what is wrong with it. */
async function asked(
  host: Host,
  { files, spans }: Targets,
  base: Request,
): Promise<{ readonly request: Request; readonly spans: Targets['spans'] }> {
  try {
    return { request: await askComparison(host, files, spans, base), spans: [] };
  } catch (error) {
    if (error instanceof RefusedError) return { request: base, spans };
    throw error;
  }
}
