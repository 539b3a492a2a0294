// Import directions: each folder of src may import the rows above its own and nothing else (DEVELOPERS.md, map of folders).
const rows = [
  'core/model',
  'core/numeric',
  'core/methods',
  'core/evidence',
  'readers',
  'compare',
  'planning',
  'settings',
  'recheck',
  'report',
  'protocol',
  'worker',
];
const surfaces = ['host', 'webview', 'cli'];

/** What a folder may import, where that is not simply every row above. */
const narrower = {
  readers: ['core/model', 'core/numeric'],
  webview: ['report', 'protocol'],
};

/** Where a package may be imported. Types of an editor or a platform count as the thing itself. */
const packages = {
  jstat: '^src/core/numeric/startingValue\\.ts$',
  papaparse: '^src/readers/papa\\.ts$',
  'smol-toml': '^src/settings/',
  valibot: '^src/(settings|protocol)/',
  preact: '^src/(report|webview)/',
  'preact-render-to-string': '^src/report/',
  'd3-scale': '^src/(report|webview)/',
  'd3-shape': '^src/(report|webview)/',
  '@noble/hashes': '^src/host/platform/[^/]+\\.web\\.ts$',
  vscode: '^src/host/',
};

const anyOf = folders => `^src/(${folders.join('|')})/`;
const moduleOf = name => `(^|node_modules/(@types/)?)${name}(/|$)`;

const directions = [...rows, ...surfaces].map(folder => {
  const above = narrower[folder] ?? rows.slice(0, rows.includes(folder) ? rows.indexOf(folder) : rows.length);
  return {
    name: `${folder} imports only what stands above it`,
    severity: 'error',
    from: { path: `^src/${folder}/` },
    to: { path: '^src/', pathNot: [anyOf([...above, folder]), '^src/platform\\.d\\.ts$'] },
  };
});

const ownPlaces = Object.entries(packages).map(([name, place]) => ({
  name: `${name} has its own place`,
  severity: 'error',
  from: { path: '^src/', pathNot: place },
  to: { path: moduleOf(name) },
}));

module.exports = {
  forbidden: [
    ...directions,
    ...ownPlaces,
    {
      name: 'no other package',
      severity: 'error',
      from: { path: '^src/' },
      to: {
        dependencyTypesNot: ['local', 'core'],
        pathNot: ['^src/', '^\\.(?!.*node_modules)', ...Object.keys(packages).map(moduleOf)],
      },
    },
    {
      name: 'node only on the platform side and the command line',
      severity: 'error',
      from: { path: '^src/', pathNot: ['^src/host/platform/[^/]+\\.node\\.ts$', '^src/cli/'] },
      to: { dependencyTypes: ['core'] },
    },
    { name: 'no cycles', severity: 'error', from: {}, to: { circular: true } },
  ],
  options: {
    tsPreCompilationDeps: true, // types are dependencies too
    doNotFollow: { path: 'node_modules' },
    enhancedResolveOptions: {
      extensions: ['.ts', '.tsx', '.d.ts', '.js', '.json'],
      mainFields: ['module', 'main', 'types'],
    },
  },
};
