// npm run bench [-- PART…]: medians of what was measured, one a line. Parts: commandLine, editor.
import { ensureBuilt } from '../../.config/built.mjs';

const parts = ['commandLine', 'editor'];
const wanted = process.argv.slice(2);
const unknown = wanted.filter(part => !parts.includes(part));
if (unknown.length > 0) throw new Error(`Unknown part ${unknown.join(', ')}; there are ${parts.join(', ')}.`);
await ensureBuilt();
for (const part of parts.filter(name => wanted.length === 0 || wanted.includes(name))) {
  await (await import(`./${part}.mjs`)).default();
}
