// The house rule: everything may import `core`; `ui` may also import `app` and `report`; the command line may
// also import `report`; only main.tsx wires the rest. Two tables, from which the rules are generated.
const mayImport = {
  core: [],
  report: ['core'],
  app: ['core'],
  sensors: ['core', 'app'],
  storage: ['core', 'app'],
  workers: ['core'],
  ui: ['core', 'app', 'report'],
  cli: ['core', 'report'],
  'service-worker': [],
};
const mayUse = {
  core: ['suncalc', 'geomagnetism', 'valibot'],
  report: ['jspdf'],
  app: ['@preact/signals-core', '@preact/signals', '@photostructure/tz-lookup', 'fflate'],
  sensors: [],
  storage: ['idb'],
  workers: ['comlink'],
  ui: ['preact', '@preact/signals'],
  cli: [],
  'service-worker': ['workbox-core', 'workbox-precaching', 'workbox-routing'],
};
const onNode = ['cli'];
const folders = Object.keys(mayImport);
const inside = (folder) => `^src/${folder}/`;
const npmKinds = ['npm', 'npm-dev', 'npm-peer', 'npm-optional', 'npm-no-pkg', 'npm-unknown'];

module.exports = {
  forbidden: [
    ...folders.map((folder) => ({
      name: `${folder}-imports`,
      comment: `src/${folder} may import only: ${[folder, ...mayImport[folder]].join(', ')}`,
      severity: 'error',
      from: { path: inside(folder) },
      to: { path: '^src/', pathNot: [folder, ...mayImport[folder]].map(inside) },
    })),
    ...folders.map((folder) => ({
      name: `${folder}-packages`,
      comment: `src/${folder} may use only: ${mayUse[folder].join(', ') || 'no package'}`,
      severity: 'error',
      from: { path: inside(folder) },
      to: {
        dependencyTypes: [...npmKinds, ...(onNode.includes(folder) ? [] : ['core'])],
        pathNot: mayUse[folder].map((name) => `node_modules/${name}/`),
      },
    })),
    {
      name: 'suncalc-behind-one-folder',
      comment: 'Units and refraction of the library are settled in one place.',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/core/solar-position/' },
      to: { path: 'node_modules/suncalc/' },
    },
    {
      name: 'new-top-folder-needs-a-row',
      comment: 'A new folder under src gets a row in both tables above.',
      severity: 'error',
      from: { path: '^src/[^/]+/', pathNot: folders.map(inside) },
      to: {},
    },
    {
      name: 'no-vague-names',
      comment: 'A file is named for what it computes.',
      severity: 'error',
      from: {},
      to: { path: '^src/.*/(utils?|helpers?|common|misc|index)([.]tsx?$|/)' },
    },
    { name: 'no-circular', comment: 'Cycles hide which part stands on which.', severity: 'error', from: {}, to: { circular: true } },
    {
      name: 'no-orphans',
      comment: 'A file nobody imports is dead.',
      severity: 'error',
      from: { orphan: true, pathNot: ['tsconfig', '^src/(main|service-worker/|cli/main)', '[.]d[.]ts$', '^tests/'] },
      to: {},
    },
    { name: 'no-unresolvable', comment: 'A misspelt import.', severity: 'error', from: {}, to: { couldNotResolve: true, pathNot: '^virtual:' } },
    { name: 'src-not-to-tests', comment: 'What ships does not stand on tests.', severity: 'error', from: { path: '^src/' }, to: { path: '^tests/' } },
  ],
  options: {
    tsPreCompilationDeps: true,
    exclude: { path: 'eslint[.]config[.]js$' },
    doNotFollow: { path: 'node_modules' },
    enhancedResolveOptions: { exportsFields: ['exports'], conditionNames: ['import', 'types', 'node', 'default'] },
  },
};
