// Which way the arrows run. Closed by default: an import that no line of `allowed` permits is an error.
// To open a new arrow, add a line here and say why in the commit; DEVELOPERS.md has the map.

/** @param {string} names a list of npm packages, `|`-separated */
const npm = (names) => `^node_modules/(${names})/`;
const fonts = '@fontsource|@fontsource-variable|@expo-google-fonts';
const node =
  '^node:|^(fs|path|crypto|stream|buffer|url|util|zlib|events|os|child_process|http|net|process)(/|$)';

/** One permission: files under `from` may import what matches one of `to`. */
const may = (from, ...to) => ({ from: { path: from }, to: { path: to } });

module.exports = {
  allowedSeverity: 'error',
  allowed: [
    may('^lib/domain/', '^lib/domain/', npm('zod|culori|papaparse')),

    may(
      '^lib/platform/',
      '^lib/platform/',
      '^lib/domain/',
      node,
      npm('zod|pino|nodemailer|@node-rs|jszip|read-excel-file'),
    ),
    may(
      '^lib/documents/',
      '^lib/documents/',
      '^lib/domain/',
      node,
      npm(`pdf-lib|@pdf-lib|subset-font|bwip-js|client-zip|jszip|papaparse|culori|zod|${fonts}`),
    ),

    may('^migrations/', npm('kysely')),
    may('^db/', '^db/', '^lib/domain/', '^lib/platform/', node, npm('kysely|pg|rate-limiter-flexible|zod')),

    // One use case does not call another: besides domain and db it sees what lies at the top of its own folder
    // and the schemas that its subject shares.
    may(
      '^lib/use-cases/',
      '^lib/use-cases/([^/]+|[^/]+/[^/]+-schemas)\\.ts$',
      '^lib/domain/',
      '^lib/documents/',
      '^lib/platform/',
      '^db/',
      npm('zod'),
    ),
    may(
      '^lib/jobs/',
      '^lib/jobs/',
      '^lib/use-cases/',
      '^lib/documents/',
      '^lib/domain/',
      '^lib/platform/',
      '^db/',
      node,
      npm('graphile-worker|zod'),
    ),
    may(
      '^lib/web/',
      '^lib/web/',
      '^lib/use-cases/',
      '^lib/domain/',
      '^lib/platform/',
      node,
      npm('next|next-auth|react|zod|zod-openapi|server-only'),
    ),
    // The addresses of pages are the one part of lib/web that runs in the browser too.
    may(
      '^components/',
      '^components/',
      '^lib/domain/',
      '^lib/web/paths\\.ts$',
      npm('react|react-dom|next|next-auth|radix-ui|get-nonce|@tanstack|zod'),
    ),
    may(
      '^app/',
      '^app/',
      '^components/',
      '^lib/web/',
      '^lib/use-cases/',
      '^lib/domain/',
      '^lib/platform/',
      npm(
        `react|react-dom|next|next-auth|get-nonce|@tanstack|radix-ui|read-excel-file|zod|server-only|tailwindcss|${fonts}`,
      ),
    ),
    may('^(proxy|instrumentation)\\.ts$', '^lib/web/', '^lib/platform/', npm('next|next-auth')),

    // Commands wire everything together; those that run before packages are there import only Node and each other.
    may(
      '^scripts/',
      '^scripts/',
      '^db/',
      '^lib/jobs/',
      '^lib/platform/',
      '^lib/domain/',
      '^lib/documents/',
      node,
      npm('kysely|pg|graphile-worker|next|smtp-server|mailparser|nodemailer|esbuild|exceljs|papaparse'),
    ),
    may('^tests/', '.'),
    may('^[^/]+\\.config\\.(ts|mjs)$', node, npm('.*')),
  ],
  forbidden: [
    {
      name: 'no-cycles',
      comment: 'Two files that need each other are one file, or a third is missing below them.',
      severity: 'error',
      from: {},
      to: { circular: true },
    },
    {
      name: 'not-to-tests',
      comment: 'Nothing of the product leans on its tests.',
      severity: 'error',
      from: { pathNot: '^tests/' },
      to: { path: '^tests/' },
    },
    {
      name: 'only-db-speaks-sql',
      comment: 'The database is reached through db/; migrations and commands are its own tools.',
      severity: 'error',
      from: { pathNot: '^(db|migrations|scripts|tests)/' },
      to: { path: npm('kysely|pg') },
    },
    {
      name: 'no-owner-in-the-web',
      comment: 'Demo data and the queue hold the owner role; pages never load them.',
      severity: 'error',
      from: { path: '^(app|components|lib/(web|use-cases|domain|documents|platform))/' },
      to: { path: '^(db/(seed/|liveness)|lib/jobs/|scripts/)' },
    },
    {
      name: 'private-parts-of-a-page',
      comment: 'A _components folder serves its own segment; what two segments share lives in components/.',
      severity: 'error',
      from: { pathNot: '^(app|tests)/' },
      to: { path: '^app/' },
    },
    {
      name: 'resolves',
      comment: 'An import that leads nowhere.',
      severity: 'error',
      from: {},
      to: { couldNotResolve: true },
    },
    {
      name: 'no-dev-packages-in-the-product',
      comment: 'What ships may not need a development package.',
      severity: 'error',
      from: { path: '^(app|components|db|lib|migrations)/' },
      to: {
        dependencyTypes: ['npm-dev'],
        dependencyTypesNot: ['type-only'],
        pathNot: '^node_modules/@types/',
      },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '^(\\.next|dist|\\.data)' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
      extensions: ['.ts', '.tsx', '.mjs', '.js', '.cjs', '.d.ts', '.json', '.css'],
    },
    cache: false,
  },
};
