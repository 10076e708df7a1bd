/** Where a folder may import from. Type imports load nothing, so that a few more are allowed. */
export interface Directions {
  readonly from: readonly string[];
  readonly types?: readonly string[];
  /** Packages by name; an entry that ends with "*" allows all that begin so. */
  readonly packages?: readonly string[];
}

type DirectionTable = Readonly<Record<string, Directions>>;

/** `shared/<folder>`: each imports the doors of folders above it only, and no package but these. */
export const SHARED: DirectionTable = {
  core: { from: [] },
  permissions: { from: [] },
  stats: { from: ['core'], packages: ['jstat', '@stdlib/*'] },
  effects: { from: ['core', 'stats'] },
  'code-book': { from: ['core'] },
  tally: { from: ['core', 'code-book'] },
  analysis: { from: ['core', 'stats', 'effects', 'code-book', 'tally'] },
  'outside-estimates': { from: ['core', 'stats', 'effects', 'analysis'] },
  'house-style': { from: ['core'] },
  format: { from: ['core', 'stats', 'effects', 'house-style', 'analysis'] },
  layout: { from: ['analysis'] },
  wording: {
    from: [
      'core',
      'stats',
      'effects',
      'code-book',
      'analysis',
      'outside-estimates',
      'house-style',
      'format',
    ],
  },
  figures: { from: ['layout'], packages: ['vega-lite'] },
  report: {
    from: [
      'core',
      'stats',
      'effects',
      'code-book',
      'analysis',
      'outside-estimates',
      'house-style',
      'format',
      'layout',
      'wording',
      'permissions',
    ],
    packages: [
      'fractional-indexing',
      'marked',
      'prosemirror-model',
      'prosemirror-transform',
      'zod/mini',
    ],
  },
  api: {
    from: [
      'core',
      'effects',
      'code-book',
      'analysis',
      'outside-estimates',
      'house-style',
      'wording',
      'permissions',
      'report',
    ],
    packages: ['zod'],
  },
};

/** Parts of `shared/report`; "." is the files beside them. */
export const REPORT: DirectionTable = {
  text: { from: ['.'] },
  blocks: { from: ['.', 'text', 'compose'] },
  compose: { from: ['.', 'text', 'blocks'] },
  steps: { from: ['.', 'text', 'blocks'] },
};

/**
 * Modules that may be imported past a door: single names that the first page or an editor needs
 * without what else the door would load.
 */
export const LEAF_DOORS: readonly string[] = [
  'shared/analysis/quantity',
  'shared/effects/measure-ids',
  'shared/effects/study-design',
  'shared/report/report',
  'shared/report/text',
  'shared/report/text/markdown',
  'shared/report/text/numerals',
  'shared/report/text/parse-text-document',
  'shared/report/text/schema',
  'shared/wording/phrase',
];

/** `server/<folder>`, or `server/<file>` for those that stand alone. Any package, any door. */
export const SERVER: DirectionTable = {
  config: { from: [] },
  templates: { from: [] },
  workers: { from: [] },
  models: { from: [] },
  errors: { from: [], types: ['config'] },
  runtime: { from: ['errors'] },
  mail: { from: [], types: ['config'] },
  static: { from: [], types: ['config'] },
  intake: { from: ['errors', 'workers'] },
  exports: { from: ['errors', 'workers'] },
  computing: { from: ['workers'] },
  counting: { from: ['intake', 'runtime'], types: ['models'] },
  session: { from: ['errors', 'runtime'], types: ['config', 'dependencies', 'models'] },
  dependencies: {
    from: [
      'config',
      'counting',
      'errors',
      'exports',
      'intake',
      'mail',
      'models',
      'runtime',
      'session',
      'templates',
    ],
  },
  services: {
    from: ['computing', 'errors', 'exports', 'intake', 'mail', 'models', 'runtime'],
    types: ['config', 'counting', 'dependencies'],
  },
  routes: {
    from: ['errors', 'exports', 'openapi', 'services', 'session'],
    types: ['config', 'dependencies', 'models'],
  },
  openapi: { from: ['routes'] },
  app: {
    from: ['errors', 'routes', 'services', 'session', 'static'],
    types: ['dependencies'],
  },
  'start-up': { from: ['app', 'services'], types: ['dependencies'] },
  main: { from: ['config', 'dependencies', 'start-up'] },
};

/** `client/src/app/<folder>`: what is below every feature. */
export const CLIENT_BASE: DirectionTable = {
  'server-api': { from: [] },
  ui: { from: ['server-api'] },
  session: { from: ['server-api', 'ui'] },
};

/** `client/src/app/<feature>`: never another feature. */
export const CLIENT_FEATURES: readonly string[] = [
  'account',
  'administration',
  'analysis-bench',
  'code-book',
  'desk',
  'help',
  'intake',
  'report-workspace',
  'sign-in',
  'study',
];

/** What every feature may import. */
export const FEATURE: Directions = { from: ['server-api', 'session', 'ui'] };

/** Only these know how a request is sent. */
export const HTTP_USERS: readonly string[] = ['server-api', 'session', 'app.config'];
