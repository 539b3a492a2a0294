import { appendFileSync, readdirSync } from 'node:fs';
import path from 'node:path';
import Mocha from 'mocha';

/** What the editor calls to run the tests. Writes one line of JSON a test to the file that the stage reads. */
export async function run(): Promise<void> {
  const file = process.env['WEIGHBEAM_TEST_RESULTS'];
  const write = (result: object) => {
    if (file !== undefined) appendFileSync(file, `${JSON.stringify(result)}\n`);
  };
  const mocha = new Mocha({ ui: 'tdd', timeout: 30_000, reporter: 'min' });
  for (const name of readdirSync(__dirname)) {
    if (name.endsWith('.test.js')) mocha.addFile(path.join(__dirname, name));
  }
  const failures = await new Promise<number>(resolve => {
    mocha
      .run(resolve)
      .on('pass', test => write({ title: test.fullTitle(), passed: true }))
      .on('fail', (test, error: Error) =>
        write({ title: test.fullTitle(), passed: false, error: error.stack ?? error.message }),
      );
  });
  write({ ended: true });
  if (failures > 0) throw new Error(`${failures} tests failed`);
}
