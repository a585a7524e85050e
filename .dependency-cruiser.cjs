/**
 * Which folder may import which. The rules are the last column of the table in DEVELOPERS.md; every one
 * has a folder in tests/layers/not-ok with an import that it must refuse.
 */

/** Folders of shared/ from the ground up: each may import only those named with it, and itself. */
const grounds = {
  units: [],
  geometry: ['units'],
  layout: ['units', 'joint'],
  joint: ['units', 'geometry'],
  wood: ['units', 'layout'],
  shell: ['units', 'geometry', 'joint', 'layout'],
  pieces: ['units', 'geometry', 'joint', 'shell', 'layout', 'wood'],
  checks: ['units', 'geometry', 'joint', 'shell', 'layout', 'wood', 'pieces'],
};

/** @param {string[]} names */
const oneOf = (names) => `(${names.join('|')})`;

const sharedRules = Object.entries(grounds).map(([folder, below]) => ({
  name: `shared-${folder}`,
  comment: `shared/${folder} may import only ${['itself', ...below].join(', ')}.`,
  severity: 'error',
  from: { path: `^shared/${folder}/`, pathNot: '\\.spec\\.ts$' },
  to: { path: '^shared/', pathNot: `^shared/${oneOf([folder, ...below])}/` },
}));

/** @param {string} from @param {string[]} may @param {string} [besides] */
function mayImport(from, may, besides) {
  const own = ['shared', 'exports', 'drizzle', 'server', 'src', 'seeds', 'tests', 'scripts'];
  const allowed = [from, ...may].map((name) => `^${name}/`);
  return {
    name: `${from}-imports`,
    comment: `${from}/ may import only ${may.length === 0 ? 'itself' : may.join(', ')}.`,
    severity: 'error',
    from: { path: `^${from}/`, pathNot: '\\.spec\\.ts$' },
    to: {
      path: `^${oneOf(own)}/`,
      pathNot: besides === undefined ? allowed : [...allowed, besides],
    },
  };
}

/** @param {string[]} names npm packages */
const packages = (names) => `(^|(^|/)node_modules/(@types/)?)${oneOf(names)}(/|$)`;

/** @type {import('dependency-cruiser').IConfiguration} */
module.exports = {
  forbidden: [
    {
      name: 'no-cycles',
      comment: 'Two files that need each other are one thing, or want a third.',
      severity: 'error',
      from: {},
      to: { circular: true },
    },
    {
      name: 'no-unresolvable',
      comment: 'The import leads nowhere.',
      severity: 'error',
      from: {},
      to: { couldNotResolve: true },
    },
    {
      name: 'not-to-spec',
      comment: 'Nothing imports a spec.',
      severity: 'error',
      from: {},
      to: { path: '\\.spec\\.ts$' },
    },
    {
      name: 'not-to-dev-packages',
      comment: 'What is shipped uses no package of devDependencies.',
      severity: 'error',
      from: { path: '^(shared|exports|drizzle|server|seeds|src)/', pathNot: '\\.spec\\.ts$' },
      to: { dependencyTypes: ['npm-dev'], dependencyTypesNot: ['type-only'], pathNot: '@types/' },
    },
    mayImport('shared', []),
    mayImport('exports', ['shared']),
    mayImport('drizzle', ['shared']),
    mayImport('server', ['shared', 'exports', 'drizzle']),
    mayImport('src', ['shared'], '^exports/svg/'),
    mayImport('seeds', ['shared', 'drizzle']),
    ...sharedRules,
    {
      name: 'pure-of-node',
      comment: 'shared/ and exports/ run anywhere; only the command line reads and writes files.',
      severity: 'error',
      from: {
        path: '^(shared|exports)/',
        pathNot: ['^exports/command-line\\.ts$', '\\.spec\\.ts$'],
      },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'pure-of-dom',
      comment: 'shared/ and exports/ use no package that needs a browser or a server.',
      severity: 'error',
      from: { path: '^(shared|exports)/', pathNot: '\\.spec\\.ts$' },
      to: {
        path: packages([
          ...['@angular', 'konva', 'three', '@svgdotjs', 'paper', 'makerjs', 'jsdom', 'rxjs'],
          ...['express', 'pg', 'drizzle-orm', 'pino'],
        ]),
      },
    },
    {
      name: 'database-only-in-stores',
      comment: 'Only stores, drizzle/ and seeds/ speak to the database.',
      severity: 'error',
      from: {
        path: '^(shared|exports|server|src)/',
        pathNot: ['^server/.*-store\\.ts$', '\\.spec\\.ts$'],
      },
      to: { path: packages(['drizzle-orm', 'pg']) },
    },
    {
      name: 'konva-only-in-canvas',
      comment: 'konva is imported only by src/app/layout/pattern/canvas.',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/app/layout/pattern/canvas/' },
      to: { path: packages(['konva']) },
    },
    {
      name: 'three-only-in-wrapped-shell',
      comment: 'three is imported only by src/app/wrapped-shell.',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/app/wrapped-shell/' },
      to: { path: packages(['three']) },
    },
    {
      name: 'svg-only-in-drawing',
      comment: 'svg.js is imported only by src/app/drawing.',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/app/drawing/' },
      to: { path: packages(['@svgdotjs']) },
    },
    {
      name: 'features-apart',
      comment: 'One feature never imports another: only platform, drawing, wrapped-shell, frame.',
      severity: 'error',
      from: {
        path: '^src/app/(sign-in|commissions|woods|cutters|people|layout)/',
        pathNot: '\\.spec\\.ts$',
      },
      to: {
        path: '^src/app/(sign-in|commissions|woods|cutters|people|layout|frame)/',
        pathNot: ['^src/app/$1/', '^src/app/layout/[^/]+\\.ts$'],
      },
    },
    {
      name: 'stations-apart',
      comment: 'One station never imports another: only what stands in layout/ beside them.',
      severity: 'error',
      from: { path: '^src/app/layout/([^/]+)/', pathNot: '\\.spec\\.ts$' },
      to: { path: '^src/app/layout/[^/]+/', pathNot: '^src/app/layout/$1/' },
    },
    {
      name: 'ground-of-the-app',
      comment: 'platform, drawing and wrapped-shell stand under the features.',
      severity: 'error',
      from: { path: '^src/app/(platform|drawing|wrapped-shell)/', pathNot: '\\.spec\\.ts$' },
      to: {
        path: '^src/app/',
        pathNot: ['^src/app/(platform|drawing)/', '^src/app/wrapped-shell/'],
      },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '^(dist|out|tests/layers/(ok|not-ok))/' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
      mainFields: ['module', 'main', 'types', 'typings'],
    },
  },
};
