// The licences of the packages that stand in the bundles, from what esbuild says it took in.
import { readFile, readdir } from 'node:fs/promises';

/** Text of dist/NOTICES.txt. Fails when a bundled package brings no licence text: it must not be shipped. */
export async function notices(metafiles) {
  const inputs = metafiles.flatMap(({ inputs }) => Object.keys(inputs));
  const folders = inputs.map(input => /^(?:.*\/)?node_modules\/(?:@[^/]+\/)?[^/]+/.exec(input)?.[0]);
  const texts = [...new Set(folders)]
    .filter(folder => folder !== undefined)
    .sort()
    .map(notice);
  return ['Weighbeam contains the following packages.', ...(await Promise.all(texts))].join(
    `\n\n${'-'.repeat(78)}\n\n`,
  );
}

async function notice(folder) {
  const { name, version, license } = JSON.parse(await readFile(`${folder}/package.json`, 'utf8'));
  const file = (await readdir(folder)).find(entry => /^licen[cs]e/i.test(entry));
  if (file === undefined) throw new Error(`${name} is bundled, but brings no licence text`);
  return `${name} ${version} (${license})\n\n${(await readFile(`${folder}/${file}`, 'utf8')).trim()}`;
}
