import { l10n, type Uri } from 'vscode';
import type { Request } from '../../compare/request';
import type { TextSpan } from '../../protocol/files';
import { openFile } from '../files/openedFile';
import { lastPart } from '../files/root';
import type { Services } from '../services';
import { whileWaiting } from '../whileWaiting';
import { askForRequest } from './askForRequest';
import { rememberAnswers, rememberedAnswers } from './remembered';

/**
 * Looks over the files, says what was taken of them, and asks all that is open from the beginning. What is answered is
 * remembered for the next time. Rejects with RefusedError when the files cannot be read, with CancellationError when the
 * person gives up.
 * @param base what is known without asking: names of the files, how to read them, the confidence
 */
export async function askComparison(
  { client, context, log, onStep }: Services,
  files: readonly Uri[],
  spans: readonly TextSpan[],
  base: Request,
): Promise<Request> {
  const title = files.map(lastPart).join(', ');
  const inputs = await Promise.all(
    files.map(async (uri, index) => (await openFile(uri, base.files[index] ?? '')).input),
  );
  const started = performance.now();
  const { rows, columns, says, readings } = await whileWaiting(l10n.t('Reading {0}', title), options =>
    client.ask({ type: 'survey', revision: 0, files: inputs, request: base, spans }, options),
  );
  log.read(readings, performance.now() - started);
  const answers = await askForRequest(client, {
    files: inputs,
    request: rows === null ? base : { ...base, rows },
    columns,
    remembered: rememberedAnswers(context.workspaceState, files),
    title: `${title} · ${says}`,
    onStep,
  });
  const request: Request = { ...base, ...answers };
  await rememberAnswers(context.workspaceState, files, request);
  return request;
}
