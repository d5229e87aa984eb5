/**
 * Who may import whom: the table in DEVELOPERS.md as rules. tests/architecture/import-rules.test.ts proves
 * that every one of them fires. `npm run check` holds the tree against them.
 */

/** The numeric core from the bottom to the top; a layer imports itself and those before it. */
const skyLayers = [
  'units',
  'time',
  'stars',
  'sun',
  'horizon',
  'phenomena',
  'visibility',
  'markers',
  'look',
  'moon',
  'planets',
  'sky-markers',
];

/** The server's lower folders in the same order. */
const serverLayers = ['config', 'db', 'policy', 'storage', 'media', 'mail', 'print', 'http'];

/** @param {string[]} layers @param {string} below @param {string} name */
function bottomToTop(layers, below, name) {
  return layers.slice(0, -1).map((layer, index) => ({
    name: `${name}-${layer}`,
    comment: `${below}/${layer} may not import what is built on it.`,
    severity: 'error',
    from: { path: `^${below}/${layer}/` },
    to: { path: `^${below}/(${layers.slice(index + 1).join('|')})/` },
  }));
}

/** Everything but what is listed. @param {string} name @param {string} from @param {string[]} allowed @param {string} comment */
function onlyFrom(name, from, allowed, comment) {
  return { name, comment, severity: 'error', from: { path: from }, to: { pathNot: allowed } };
}

export default {
  forbidden: [
    {
      name: 'no-circles',
      comment:
        'Files that import each other in a circle cannot be started one at a time. Types may, and entities may: their relations point both ways.',
      severity: 'error',
      from: { pathNot: '^server/db/entities/' },
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
    },
    {
      name: 'nothing-missing',
      comment: 'An import that leads nowhere.',
      severity: 'error',
      from: {},
      to: { couldNotResolve: true },
    },
    {
      name: 'no-development-packages-in-the-product',
      comment: 'A package under devDependencies is not there where the product runs.',
      severity: 'error',
      from: { path: '^(shared|server|src)/' },
      to: { dependencyTypes: ['npm-dev', 'npm-no-pkg', 'npm-unknown'], dependencyTypesNot: ['type-only'] },
    },
    {
      name: 'product-never-imports-tests',
      comment: 'Tests know the product, never the other way round.',
      severity: 'error',
      from: { path: '^(shared|server|src|docker-free-scripts)/' },
      to: { path: '^tests/' },
    },

    onlyFrom(
      'sky-stands-alone',
      '^shared/sky/',
      ['^shared/sky/', '(^|/)node_modules/astronomy-engine/'],
      'The numeric core imports astronomy-engine and itself.',
    ),
    ...bottomToTop(skyLayers, 'shared/sky', 'sky-upward'),
    {
      name: 'sky-layers-below-the-door',
      comment: 'The door stands above the layers: it checks what comes in and is not used from inside.',
      severity: 'error',
      from: { path: '^shared/sky/[^/]+/' },
      to: { path: '^shared/sky/index\\.ts$' },
    },
    {
      name: 'sky-through-its-door',
      comment:
        'Everybody else takes the core through shared/sky/index.ts (or its constants in vocabulary.ts).',
      severity: 'error',
      from: { path: '^(shared|server|src)/', pathNot: '^shared/sky/' },
      to: { path: '^shared/sky/', pathNot: '^shared/sky/(index|vocabulary)\\.ts$' },
    },
    onlyFrom(
      'calendar-rules-are-pure',
      '^shared/calendar/',
      ['^shared/calendar/', '^shared/sky/index\\.ts$', '^shared/kernel/'],
      'Calendar rules import the core’s door and the kernel.',
    ),
    onlyFrom(
      'contracts-know-constants-only',
      '^shared/contracts/',
      ['^shared/contracts/', '^shared/kernel/', '^shared/sky/vocabulary\\.ts$', '(^|/)node_modules/zod/'],
      'Contracts import zod, the kernel and the core’s constants.',
    ),
    onlyFrom(
      'sheet-is-geometry',
      '^shared/sheet/',
      ['^shared/sheet/', '^shared/calendar/', '^shared/kernel/'],
      'The drawn boards import calendar rules and the kernel.',
    ),
    onlyFrom('kernel-imports-nothing', '^shared/kernel/', ['^shared/kernel/'], 'The kernel imports itself.'),
    onlyFrom(
      'locales-are-texts',
      '^shared/locales/',
      ['^shared/locales/', '^shared/kernel/'],
      'Texts import nothing but helpers of the kernel.',
    ),
    {
      name: 'shared-without-node',
      comment: 'shared runs in the browser and in tests of time zones alike: no files, no network, no clock.',
      severity: 'error',
      from: { path: '^shared/' },
      to: { dependencyTypes: ['core'] },
    },

    {
      name: 'server-base-below-features',
      comment: 'What every feature stands on may not know a feature.',
      severity: 'error',
      from: { path: '^server/(config|db|policy|storage|media|mail|print|http)/' },
      to: { path: '^server/(features/|workers/|app\\.ts$|main\\.ts$)' },
    },
    ...bottomToTop(serverLayers, 'server', 'server-upward'),
    {
      name: 'features-meet-through-services',
      comment: 'A feature takes another one by its *.service.ts only.',
      severity: 'error',
      from: { path: '^server/features/([^/]+)/' },
      to: {
        path: '^server/features/',
        pathNot: ['^server/features/$1/', '^server/features/[^/]+/[^/]+\\.service\\.ts$'],
      },
    },
    {
      name: 'features-below-the-app',
      comment: 'The app wires the features; none of them knows it.',
      severity: 'error',
      from: { path: '^server/features/' },
      to: { path: '^server/(app|main)\\.ts$' },
    },
    {
      name: 'routes-without-database',
      comment: 'A route takes a request apart, calls its service and answers.',
      severity: 'error',
      from: { path: '\\.routes\\.ts$' },
      to: { path: ['(^|/)node_modules/typeorm/', '^server/db/'] },
    },
    {
      name: 'services-without-express',
      comment: 'Services and mappers work without HTTP; of server/http they know errors and who asks.',
      severity: 'error',
      from: { path: '^server/features/.*\\.(service|mapper|repository)\\.ts$' },
      to: {
        path: ['(^|/)node_modules/express', '^server/http/'],
        pathNot: '^server/http/(app-error|actor|context)\\.ts$',
      },
    },
    onlyFrom(
      'workers-know-shared-only',
      '^server/workers/',
      ['^server/workers/', '^shared/', '^node:', '^worker_threads$', '(^|/)node_modules/'],
      'Work off the main thread takes plain values and the shared rules.',
    ),
    {
      name: 'server-never-imports-screens',
      comment: 'The two sides meet in shared.',
      severity: 'error',
      from: { path: '^(server|shared)/' },
      to: { path: '^src/' },
    },

    {
      name: 'screens-never-import-server',
      comment: 'Types too: a screen knows the contracts, never the tables.',
      severity: 'error',
      from: { path: '^(src|shared)/' },
      to: { path: '^server/' },
    },
    {
      name: 'screens-without-node',
      comment: 'A browser has no files and no processes.',
      severity: 'error',
      from: { path: '^src/' },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'kit-below-features',
      comment: 'src/ui and src/lib know nothing of the product.',
      severity: 'error',
      from: { path: '^src/(ui|lib)/' },
      to: { path: '^src/(features|app)/' },
    },
    {
      name: 'screen-features-apart',
      comment: 'Features meet in src/app/routes, where pages put them together.',
      severity: 'error',
      from: { path: '^src/features/([^/]+)/' },
      to: { path: '^src/(features|app)/', pathNot: '^src/features/$1/' },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '^(dist|data|\\.tmp)/' },
    tsPreCompilationDeps: true,
    detectJSDocImports: true,
    enhancedResolveOptions: {
      conditionNames: ['dawnpeg-source', 'import', 'node', 'default', 'types'],
      exportsFields: ['exports'],
      extensions: ['.ts', '.tsx', '.mjs', '.js', '.json', '.d.ts'],
      mainFields: ['module', 'main', 'types'],
    },
    skipAnalysisNotInRules: true,
  },
};
