import { l10n } from 'vscode';
import type { Request } from '../../compare/request';
import { readRequest } from '../../protocol/request';
import { askForRequest } from '../asking/askForRequest';
import { rememberAnswers, rememberedAnswers } from '../asking/remembered';
import { RefusedError } from '../compute/computeClient';
import { openFile } from '../files/openedFile';
import { lastPart, recordName, rootOf } from '../files/root';
import type { Host } from '../host';
import { chooseFile } from '../selecting/chooseFile';
import { targetsOf, type Targets } from '../selecting/targets';
import { settingsFor } from '../settingsFor';
import { whileWaiting } from '../whileWaiting';
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
    const request =
      given === null ? await asked(host, targets, base) : { ...base, ...given, files: base.files };
    await host.panels.show({ files, root }, request);
  },
});

/** The editor's menus hand on where they were opened; anything else that is a plain object is a request. */
const isRequest = (value: unknown): boolean =>
  typeof value === 'object' && value !== null && !Array.isArray(value) && !('groupId' in value);

async function chosen(): Promise<Targets | null> {
  const uri = await chooseFile();
  return uri === null ? null : { files: [uri], spans: [] };
}

async function asked(host: Host, { files, spans }: Targets, base: Request): Promise<Request> {
  const { client, context, log } = host;
  const title = files.map(lastPart).join(', ');
  try {
    const inputs = await Promise.all(
      files.map(async (uri, index) => (await openFile(uri, base.files[index] ?? '')).input),
    );
    const started = performance.now();
    const surveyed = await whileWaiting(l10n.t('Reading {0}', title), options =>
      client.ask({ type: 'survey', revision: 0, files: inputs, request: base, spans }, options),
    );
    log.read(surveyed.readings, performance.now() - started);
    const { rows, columns, says } = surveyed;
    const answers = await askForRequest(client, {
      files: inputs,
      request: rows === null ? base : { ...base, rows },
      columns,
      remembered: rememberedAnswers(context.workspaceState, files),
      title: `${title} · ${says}`,
    });
    const request: Request = { ...base, ...answers };
    await rememberAnswers(context.workspaceState, files, request);
    return request;
  } catch (error) {
    if (error instanceof RefusedError) return base; // the panel says what is wrong with the file
    throw error;
  }
}
