// Which room may import what: the table in DEVELOPERS.md, for the check of the borders.
// Paths are those from the project's folder; a package is matched where it is installed.

const anyPackage = '^node_modules/'

/**
 * What a room may import besides its own files: the index of other rooms, and packages by name.
 *
 * @type {Record<string, { rooms: string[], packages: string[] }>}
 */
const rooms = {
  core: { rooms: [], packages: ['complex.js', 'ml-matrix'] },
  sheet: { rooms: ['core'], packages: ['valibot', 'fflate', '@noble/hashes'] },
  drawing: { rooms: ['sheet', 'core'], packages: ['jspdf'] },
}

/** The doors of a room: its index, and those of parts that stay out of the first load. */
const doorOf = (/** @type {string} */ room) =>
  `^src/${room}/((estimate|circuit|report|pdf)/)?index\\.ts$`

/** Where the program begins: whatever no path from here reaches is left over. */
const beginnings =
  '^(src/app/main\\.tsx|src/app/worker/estimate\\.worker\\.ts|src/command/[^/]+\\.(ts|mjs|cjs)|vite\\.config\\.ts)$'

/** @type {import('dependency-cruiser').IForbiddenRuleType[]} */
const rules = [
  ...Object.entries(rooms).map(([room, allowed]) => ({
    name: `what-${room}-may-import`,
    comment: `src/${room} imports its own files and ${[...allowed.rooms, ...allowed.packages].join(', ')}.`,
    from: { path: `^src/${room}/` },
    to: {
      pathNot: [
        `^src/${room}/`,
        ...allowed.rooms.map(doorOf),
        ...allowed.packages.map((name) => `${anyPackage}${name}/`),
      ],
    },
  })),
  {
    name: 'what-app-may-import',
    comment: 'The page needs no command, and no test.',
    from: { path: '^src/app/' },
    to: { path: '^(src/command|test|e2e)/' },
  },
  {
    name: 'no-node-in-the-page',
    comment: 'The page runs in a browser, where nothing of Node is.',
    from: { path: '^src/app/' },
    to: { dependencyTypes: ['core'] },
  },
  {
    name: 'what-command-may-import',
    comment: 'The commands run in Node, without the page.',
    from: { path: '^src/command/' },
    to: { path: '^(src/app|test|e2e)/' },
  },
  {
    name: 'through-the-door',
    comment: 'A room is entered by an index.ts, which lists its public names.',
    from: { path: '^src/([^/]+)/' },
    to: { path: '^src/', pathNot: ['^src/$1/', doorOf('[^/]+')] },
  },
  {
    name: 'installed-for-the-page',
    comment: 'What the page runs on is a dependency, not a tool of development.',
    from: { path: '^src/(core|sheet|drawing|app)/' },
    to: { path: anyPackage, dependencyTypesNot: ['npm', 'type-only'] },
  },
  {
    name: 'konva-piece-by-piece',
    comment: 'The full entries bring every shape into the first load: import shapes one by one.',
    from: { path: '^src/app/' },
    to: {
      path: `${anyPackage}(konva/lib/index|react-konva/(lib|es)/ReactKonva\\.)`,
      dependencyTypesNot: ['type-only'],
    },
  },
  {
    name: 'no-circle',
    comment: 'Files that import each other cannot be read one at a time.',
    from: {},
    to: { circular: true },
  },
  {
    name: 'nothing-left-over',
    comment: 'The program never gets to this file.',
    from: { path: beginnings },
    to: { path: '^src/', pathNot: ['\\.d\\.ts$', beginnings], reachable: false },
  },
  {
    name: 'nothing-alone',
    comment: 'This file imports nothing, and nothing imports it.',
    // The build reads the service worker as text, and writes its list of files into it.
    from: {
      orphan: true,
      pathNot: [
        '\\.d\\.ts$',
        '\\.(test|spec)\\.tsx?$',
        '\\.cjs$',
        '^\\.config/service-worker\\.js$',
      ],
    },
    to: {},
  },
  {
    name: 'nothing-missing',
    comment: 'What is imported must exist.',
    from: {},
    to: { couldNotResolve: true },
  },
]

/**
 * The rules of the rooms, each with its reason. Breaking any of them is an error.
 *
 * @type {import('dependency-cruiser').IForbiddenRuleType[]}
 */
export const roomRules = rules.map((rule) => ({ ...rule, severity: 'error' }))
