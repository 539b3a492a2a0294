import { readdir, readFile } from 'node:fs/promises';
import path from 'node:path';
import { digitsOf, summaryOf, type Grid } from './accuracyGrids';

const ownGrids = 'test/core/numeric/fixtures';

/** Prints `name: points, fewest digits, median digits` for each grid file named, or for the project's own. */
async function main(files: readonly string[]): Promise<number> {
  const named = files.length > 0 ? files : await filesIn(ownGrids);
  let failed = false;
  for (const file of named) {
    const grid = JSON.parse(await readFile(file, 'utf8')) as Grid;
    const digits = digitsOf(grid);
    if (digits === null) {
      process.stderr.write(`${file}: nothing here computes ${grid.cols.join(', ')}\n`);
      failed = true;
      continue;
    }
    const { fewest, median } = summaryOf(digits);
    process.stdout.write(`${grid.name}: ${digits.length}, ${fewest.toFixed(1)}, ${median.toFixed(1)}\n`);
  }
  return failed ? 1 : 0;
}

async function filesIn(folder: string): Promise<readonly string[]> {
  const names = await readdir(folder);
  return names.filter(name => name.endsWith('.json')).map(name => path.join(folder, name));
}

void main(process.argv.slice(2)).then(code => {
  process.exitCode = code;
});
