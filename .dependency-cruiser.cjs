// Which folder may import which. Each rule says why, so that a failing build teaches.
/** @type {import('dependency-cruiser').IConfiguration} */
module.exports = {
  forbidden: [
    { name: 'no-circular', severity: 'error', comment: 'Data flows one way.', from: {}, to: { circular: true } },
    {
      name: 'ventilation-is-pure', severity: 'error',
      comment: 'The core runs on both sides: zod and itself, no clock, no I/O.',
      from: { path: '^packages/ventilation/src', pathNot: '\\.test\\.ts$' },
      to: { pathNot: '^(packages/ventilation/|node_modules/zod/)' },
    },
    {
      name: 'ui-draws-only', severity: 'error',
      comment: 'Shared components take props and return markup; they never fetch.',
      from: { path: '^packages/ui/' }, to: { path: '^(apps/|packages/client/|db/)' },
    },
    {
      name: 'client-below-apps', severity: 'error', comment: 'Packages know no app.',
      from: { path: '^packages/' }, to: { path: '^apps/' },
    },
    {
      name: 'apps-are-islands', severity: 'error', comment: 'Apps share code through packages.',
      from: { path: '^apps/([^/]+)/' }, to: { path: '^apps/', pathNot: '^apps/$1/' },
    },
    {
      name: 'wall-only-reads', severity: 'error',
      comment: 'A wall cannot write: the write half of the client is out of its reach.',
      from: { path: '^apps/wall/' }, to: { path: '^packages/client/src/writes/' },
    },
    {
      name: 'features-are-islands', severity: 'error',
      comment: 'A feature is whole in its folder; what two need goes to a package or to the app.',
      from: { path: '^apps/tablet/src/features/([^/]+)/' },
      to: { path: '^apps/tablet/src/features/', pathNot: '^apps/tablet/src/features/$1/' },
    },
    {
      name: 'features-below-app', severity: 'error', comment: 'The shell knows the features, not the reverse.',
      from: { path: '^apps/tablet/src/features/' }, to: { path: '^apps/tablet/src/app/' },
    },
    {
      name: 'server-is-headless', severity: 'error', comment: 'No screen code in the server.',
      from: { path: '^apps/server/' }, to: { path: '^(packages/(ui|client)/|node_modules/react)' },
    },
    {
      name: 'sql-only-in-queries', severity: 'error',
      comment: 'Knex is called in queries (and by the one that opens it); elsewhere only its types.',
      from: { path: '^apps/server/src/', pathNot: '^apps/server/src/queries/' },
      to: { path: '^node_modules/(knex|better-sqlite3)/', dependencyTypesNot: ['type-only'] },
    },
    {
      name: 'queries-at-the-bottom', severity: 'error', comment: 'Queries decide nothing and know no service.',
      from: { path: '^apps/server/src/queries/' }, to: { path: '^apps/server/src/(http|services|realtime)/' },
    },
    {
      name: 'services-below-http', severity: 'error', comment: 'Services see no request.',
      from: { path: '^apps/server/src/services/' },
      to: { path: '^(apps/server/src/(http|realtime)/|node_modules/(express|socket\\.io)/)' },
    },
    {
      name: 'migrations-are-frozen', severity: 'error',
      comment: 'A migration must run the same in ten years: no product code.',
      from: { path: '^db/migrations/' }, to: { path: '^(apps|packages)/' },
    },
    {
      name: 'no-tests-in-product', severity: 'error', comment: 'Product code never imports a test.',
      from: { path: '^(apps|packages|db)/', pathNot: '\\.test\\.tsx?$' }, to: { path: '(\\.test\\.tsx?$|^tests/)' },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '(/dist/|^db/data/)' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: { exportsFields: ['exports'], conditionNames: ['import', 'types', 'default'] },
  },
};
