/** Who may import whom: the layers of DEVELOPERS.md as rules. */
const CORE = ['numerics', 'shape', 'flow', 'polar', 'wing', 'decision', 'job']
/** Of the core's folders, each may import those before it; `flight` stands beside `numerics`. */
const below = (folder) => ['flight', ...CORE.slice(0, CORE.indexOf(folder) + 1)]

const only = (name, from, allowed, extra = {}) => ({
  name,
  severity: 'error',
  from: { path: from },
  to: { pathNot: allowed, ...extra },
})

module.exports = {
  forbidden: [
    { name: 'no-cycles', severity: 'error', from: {}, to: { circular: true } },
    { name: 'no-unresolved', severity: 'error', from: {}, to: { couldNotResolve: true, pathNot: '\\?raw$' } },
    ...CORE.map((folder) =>
      only(
        `core-${folder}`,
        `^src/core/${folder}/`,
        below(folder).map((name) => `^src/core/${name}/`),
      ),
    ),
    only('core-flight', '^src/core/flight/', ['^src/core/(numerics|flight)/']),
    only('core-door', '^src/core/index', ['^src/core/']),
    {
      name: 'one-door-to-the-core',
      severity: 'error',
      comment: 'Only src/core/index.ts may be imported from outside the core.',
      from: { path: '^src/(?!core/)' },
      to: { path: '^src/core/(?!index\\.ts$)' },
    },
    only('io', '^src/io/', [
      '^src/io/',
      '^src/core/index\\.ts$',
      '^node_modules/(papaparse|valibot|@types/papaparse)',
    ]),
    only('run', '^src/run/', ['^src/run/', '^src/core/index\\.ts$']),
    only('shared', '^src/shared/', ['^src/shared/', '^src/core/index\\.ts$'], {
      dependencyTypesNot: ['type-only'],
    }),
    {
      name: 'main-knows-no-aerodynamics',
      severity: 'error',
      from: { path: '^src/main/' },
      to: { path: '^src/(core|run|cli|renderer)/' },
    },
    {
      name: 'renderer-computes-in-workers',
      severity: 'error',
      from: { path: '^src/renderer/', pathNot: '^src/renderer/worker/' },
      to: { path: '^src/(core|run)/', dependencyTypesNot: ['type-only'] },
    },
    {
      name: 'renderer-stays-in-the-page',
      severity: 'error',
      from: { path: '^src/renderer/' },
      to: { path: '^src/(main|cli|serve)/' },
    },
    {
      name: 'chart-library-in-charts-only',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/renderer/charts/' },
      to: { path: '^node_modules/chart\\.js' },
    },
    {
      name: 'no-node-in-pure-layers',
      severity: 'error',
      from: { path: '^src/(core|io|run|shared|renderer)/' },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'cli',
      severity: 'error',
      from: { path: '^src/cli/' },
      to: { path: '^src/(main|renderer|serve)/' },
    },
  ],
  options: {
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.base.json' },
    doNotFollow: { path: 'node_modules' },
    moduleSystems: ['es6'],
    extraExtensionsToScan: ['.json', '.txt'],
  },
}
