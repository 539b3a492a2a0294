import { version } from '../../package.json';
import { answer, type Answered } from '../compare/answer';
import type { Provenance } from '../core/model/settings';
import { figureSvg } from '../report/figure/figureSvg';
import { htmlPage } from '../report/html';
import { jsonReport } from '../report/json';
import { markdownReport } from '../report/markdown';
import { textReport } from '../report/text';
import { viewOf, type View } from '../report/view';
import { blockFrom } from '../settings/block';
import { printBlock } from '../settings/printBlock';
import { offsetTime } from '../settings/offsetTime';
import { provenanceOf, saidBy, wishOf } from './compareRequest';
import { refuseContradictions } from './contradictions';
import { diskSource } from './diskSource';
import { untied, withFlags } from './answerFlags';
import { english } from './english';
import { compareFlags, formats } from './compareFlags';
import { createHasher } from './hasher';
import { helpPage } from './help';
import { Exit, type ExitCode, type Io } from './io';
import { placeOf, recipeOf } from './like';
import { likeAsked } from './likeAsked';
import { parseOptions, type Options } from './options';
import { writeOut, type Output } from './output';
import { nameFiles, type NamedFile } from './paths';
import { platform } from './platform';
import { complain } from './problems';
import { refuseUnheard } from './unheard';
import { UsageError } from './usageError';

const example = `for example
  weighbeam compare firings.csv --of hardness --by schedule --per firing \\
    --test "slow cool" --reference standard --matters 15`;

/** The page of --help. */
export const compareHelp = (): string =>
  helpPage(
    'compare FILE [FILE] [flags]',
    'Compares groups of measurements in a CSV file: whether they differ, by how much, and whether that depends on the assumption. Two files: one group a file.',
    compareFlags,
    example,
  );

const viewWith = (
  { comparison, table, files }: Answered,
  provenance: Provenance,
  blockText: string | null,
): View => viewOf(comparison, { t: english, table, files, version, provenance, blockText });

/** Stands for a block that is not printed; null where none could be made, so that the view says why. */
const unprinted = ({ comparison }: Answered): string | null => (comparison.open.length === 0 ? '' : null);

/** The answer in one format. A record is only made for the formats that hold one: its digests read every row again. */
function writtenAs(
  format: (typeof formats)[number],
  answered: Answered,
  provenance: Provenance,
  written: string,
): string {
  if (format === 'json') return `${JSON.stringify(jsonReport(answered.comparison, english), null, 2)}\n`;
  if (format === 'text')
    return untied(
      textReport(withFlags(viewWith(answered, provenance, unprinted(answered)), answered.comparison)),
    );
  const block = printBlock(blockFrom(answered, provenance, { version, written, createHasher }));
  if (format === 'block') return block;
  const view = viewWith(answered, provenance, block);
  return format === 'markdown' ? markdownReport(view) : htmlPage(view);
}

async function compareFiles(options: Options, named: readonly NamedFile[], io: Io): Promise<ExitCode> {
  const names = named.map(({ name }) => name);
  const format = options.choice('format', formats) ?? 'text';
  const sources = await Promise.all(named.map(({ file, name }) => diskSource(file, name)));
  const like = options.text('like');
  const recipe = like === undefined ? null : await recipeOf(like, io.cwd);
  const [said, wish] = [saidBy(options, names), wishOf(options)];
  const provenance = provenanceOf(options, recipe?.purpose);
  const answered =
    recipe === null
      ? await answer(sources, { files: names, wish, ...said }, platform)
      : await likeAsked(recipe, said, wish, sources);
  refuseUnheard(said, answered);
  const written = writtenAs(format, answered, provenance, offsetTime(io.now()));

  const read = [...options.words, ...(like === undefined ? [] : [placeOf(like).note])];
  const figure = options.text('figure');
  const out = options.text('out');
  const drawn = figure === undefined ? '' : figureSvg(viewWith(answered, provenance, unprinted(answered)));
  const outputs: readonly Output[] = [
    ...(figure === undefined ? [] : [{ flag: 'figure', name: figure, text: drawn } as const]),
    ...(out === undefined ? [] : [{ flag: 'out', name: out, text: written } as const]),
  ];
  await writeOut(outputs, { cwd: io.cwd, read });
  if (out === undefined) io.write(written);
  return Exit.Done;
}

/** weighbeam compare: reads, compares, and writes the answer in the format asked for. */
export async function compareCommand(argv: readonly string[], io: Io): Promise<ExitCode> {
  const options = parseOptions(argv, 'compare', compareFlags);
  if (options.has('help')) {
    io.write(compareHelp());
    return Exit.Done;
  }
  const files = options.words;
  if (files.length === 0) {
    throw new UsageError('No file was named', 'Write weighbeam compare FILE; see --help.');
  }
  refuseContradictions(options);
  const named = await nameFiles(files, io.cwd, options.text('root'));
  try {
    return await compareFiles(options, named, io);
  } catch (error) {
    return complain(error, io, options.text('format') === 'json', files); // here the files of a place are known
  }
}
