/** The rooms of the house, from the cellar up: each may import only from those before it. See DEVELOPERS.md. */
const ROOMS = [
  'physics',
  'units',
  'shelf',
  'built-in',
  'documents',
  'substances',
  'steps',
  'timeline',
  'quantities',
  'verdicts',
  'changes',
  'reports',
  'cli',
  'editor',
  'generate',
];

/** Room by room, those that it must not import from. The built-in data are documents that were read when the program was made. */
const upward = ROOMS.map((room, index) => ({
  name: `${room}-imports-downward`,
  comment: `${room}/ may import only from rooms below it.`,
  severity: 'error',
  from: { path: `^src/${room}/` },
  to: { path: ROOMS.slice(index + 1).map((above) => `^src/${above}/`), dependencyTypesNot: ['type-only'] },
})).filter(({ to }) => to.path.length > 0);

module.exports = {
  forbidden: [
    ...upward,
    {
      name: 'physics-stands-alone',
      comment: 'physics/ imports nothing but its own files.',
      severity: 'error',
      from: { path: '^src/physics/' },
      to: { pathNot: '^src/physics/' },
    },
    {
      name: 'one-way-out',
      comment: 'Only cli/, editor/ and the disk shelf touch the file system or the process.',
      severity: 'error',
      from: { path: '^src/', pathNot: ['^src/cli/', '^src/editor/', '^src/generate/', '^src/shelf/'] },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'no-circles',
      severity: 'error',
      from: {},
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
    },
  ],
  options: {
    tsConfig: { fileName: 'tsconfig.json' },
    tsPreCompilationDeps: true,
    doNotFollow: { path: 'node_modules' },
  },
};
