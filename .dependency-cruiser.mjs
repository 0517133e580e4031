/**
 * The import rule: who may import whom, as two tables. A room may import itself and the rooms in its row; every other
 * path under src/ is closed to it. An import only points to what already exists when the room runs.
 */
import swc from '@swc/core';

/**
 * dependency-cruiser asks the parser for TypeScript without JSX and stops at the first tag: tell it which files have tags.
 */
const { parseFileSync } = swc;
Object.assign(swc, {
  parseFileSync: (/** @type {string} */ path, /** @type {object} */ options) =>
    parseFileSync(path, { ...options, syntax: 'typescript', tsx: path.endsWith('.tsx') }),
});

const core = [
  'numeric',
  'quantity',
  'document',
  'input',
  'fluid',
  'element',
  'solve',
  'reading',
  'traverse',
  'uncertainty',
  'check',
  'result',
  'run',
  'compare',
  'log',
];
const before = (/** @type {string} */ room) => core.slice(0, core.indexOf(room)).map((earlier) => `core/${earlier}`);
const seen = ['core/result', 'views/present', 'views/words'];

export const mayImport = {
  ...Object.fromEntries(core.map((room) => [`core/${room}`, before(room)])),
  state: ['core/document', 'core/run', 'core/compare', 'core/result'],
  persist: ['core/document'],
  worker: ['core/document', 'core/log', 'core/result'],
  'views/words': ['core/document', 'core/input', 'core/check', 'core/result'],
  'views/present': ['core/quantity', 'core/document', 'core/result', 'views/words'],
  'views/chart': seen,
  'views/drawing': seen,
  'views/sheet': [...seen, 'views/chart', 'views/drawing'],
  'views/screen': [...seen, 'core/quantity', 'core/document', 'views/chart', 'views/drawing', 'state'],
  'views/headless': [...seen, 'core/document', 'core/run', 'core/log'],
  app: ['core', 'state', 'persist', 'worker', 'views'],
};

/** Outside packages, each with the only rooms that may know it. A package without a row is closed to all of src/. */
export const packages = {
  'decimal.js': ['core/quantity', 'core/input'],
  valibot: ['core/document', 'core/input'],
  zustand: ['state', 'views/screen'],
  zundo: ['state'],
  idb: ['persist'],
  'browser-fs-access': ['persist'],
  react: ['views/screen', 'views/chart', 'views/drawing', 'views/sheet', 'app'],
  'react-dom': ['app'],
  recharts: ['views/chart'],
  'virtual:pwa-register': ['app'],
  vite: ['app'],
};

const at = (/** @type {string[]} */ rooms) => `^src/(${rooms.join('|')})(/|\\.)`;
const literal = (/** @type {string} */ text) => text.replaceAll('.', '\\.');
const packagePath = (/** @type {string} */ name) => `(^|/node_modules/|^node_modules/)${literal(name)}(/|$)`;

const roomRules = Object.entries(mayImport).map(([room, rooms]) => ({
  name: `room-${room.replace('/', '-')}`,
  comment: `${room} may import: ${rooms.join(', ') || 'nothing'}.`,
  severity: 'error',
  from: { path: at([room]) },
  to: { path: '^src/', pathNot: at([room, ...rooms]) },
}));

const packageRules = Object.entries(packages).map(([name, rooms]) => ({
  name: `package-${name.replace(/[.:]/, '-')}`,
  comment: `${name} is known only to: ${rooms.join(', ')}.`,
  severity: 'error',
  from: { path: '^src/', pathNot: at(rooms) },
  to: { path: packagePath(name) },
}));

const houseRules = [
  {
    name: 'every-folder-is-a-room',
    comment: 'A new folder needs a row in mayImport.',
    from: { path: '^src/', pathNot: at(Object.keys(mayImport)) },
    to: {},
  },
  {
    name: 'every-package-has-its-rooms',
    comment: 'A new package needs a row in packages.',
    from: { path: '^src/' },
    to: {
      pathNot: ['^src/', '^tests/', ...Object.keys(packages).map(packagePath)],
      dependencyTypesNot: ['core', 'local', 'unknown'],
    },
  },
  {
    name: 'every-import-resolves',
    comment: 'A path that leads nowhere escapes every other rule.',
    from: { path: '^src/' },
    to: { couldNotResolve: true, pathNot: '^virtual:pwa-register$' },
  },
  {
    name: 'node-only-in-app',
    comment: 'Everything but the entry of the command line runs in a browser too.',
    from: { path: '^src/', pathNot: at(['app']) },
    to: { dependencyTypes: ['core'] },
  },
  {
    name: 'elements-are-strangers',
    comment: 'Two elements share through element/shared, never with each other.',
    from: { path: '^src/core/element/(?!registry|contract|shared/)([^/.]+)' },
    to: { path: '^src/core/element/', pathNot: '^src/core/element/(contract|shared/|$1[/.])' },
  },
  {
    name: 'fluid-models-are-strangers-to-the-form',
    comment: 'A fluid model knows physics, not the form: only fluid/state reads the input.',
    from: { path: '^src/core/fluid/(?!state[-.])' },
    to: { path: '^src/core/(document|input)/' },
  },
  { name: 'no-circle', comment: 'Two files that need each other are one file.', from: {}, to: { circular: true } },
  {
    name: 'no-orphan',
    comment: 'A file that nobody imports and that imports nothing is dead.',
    from: { orphan: true, path: '^src/', pathNot: '\\.d\\.ts$' },
    to: {},
  },
  {
    name: 'src-never-sees-tests',
    comment: 'Tests know the source, the source knows no test.',
    from: { path: '^src/' },
    to: { path: '^tests/' },
  },
].map((rule) => ({ ...rule, severity: 'error' }));

export default {
  forbidden: [...roomRules, ...packageRules, ...houseRules],
  options: {
    tsPreCompilationDeps: true, // type-only imports count too
    parser: 'swc', // without a parser of its own the tool reads no TypeScript and reports success
    doNotFollow: { path: 'node_modules' },
    enhancedResolveOptions: {
      extensions: ['.ts', '.tsx', '.js', '.mjs'],
      exportsFields: ['exports'],
      conditionNames: ['import', 'node', 'default'],
    },
  },
};
