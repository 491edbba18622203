/** Who may import whom. Each rule is shown to bite in test/house/import-rules.spec.ts. */
const outside = (paths) => ({ pathNot: paths });

module.exports = {
  forbidden: [
    {
      name: 'shared-is-pure',
      comment: 'shared runs in browser and server alike: no I/O, no framework.',
      severity: 'error',
      from: { path: '^shared/', pathNot: '\\.spec\\.ts$' },
      to: outside(['^shared/', 'node_modules/(zod|decimal\\.js)/']),
    },
    {
      name: 'src-knows-no-server',
      comment: 'The browser reaches the server through the API alone.',
      severity: 'error',
      from: { path: '^src/' },
      to: { path: '^(api|seeds)/' },
    },
    {
      name: 'features-stand-alone',
      comment: 'A feature of the client uses ui, api-client and session, never another feature.',
      severity: 'error',
      from: { path: '^src/app/(catalogue|bench|quotes|orders|money|company|receivables|plant|market|price-desk|schedule)/' },
      to: {
        path: '^src/app/(catalogue|bench|quotes|orders|money|company|receivables|plant|market|price-desk|schedule)/',
        pathNot: '^src/app/$1/',
      },
    },
    {
      name: 'only-database-opens-a-connection',
      severity: 'error',
      from: { path: '^(api|seeds|server)', pathNot: ['^api/database/', '\\.spec\\.ts$'] },
      to: { path: 'node_modules/better-sqlite3/' },
    },
    {
      name: 'only-http-and-edges-know-express',
      comment: 'Use cases, stores and pure rules never see a request.',
      severity: 'error',
      from: { path: '^api/', pathNot: ['^api/http/', '^api/api\\.ts$', '^api/local/', '-routes\\.ts$', '\\.spec\\.ts$'] },
      to: { path: 'node_modules/(@types/)?express/' },
    },
    {
      name: 'only-stores-speak-drizzle',
      severity: 'error',
      from: { path: '^api/', pathNot: ['^api/database/', '-store\\.ts$', 'verify-ledger', '\\.spec\\.ts$'] },
      to: { path: 'node_modules/drizzle-orm/' },
    },
    {
      name: 'only-the-mail-sender-knows-nodemailer',
      severity: 'error',
      from: { path: '^(api|seeds|server)', pathNot: ['^api/mail/mail-sender\\.ts$', '\\.spec\\.ts$'] },
      to: { path: 'node_modules/(@types/)?nodemailer/' },
    },
    {
      name: 'only-the-card-gateway-knows-stripe',
      severity: 'error',
      from: { path: '^(api|seeds|server)', pathNot: ['^api/payments/card-gateway\\.ts$', '\\.spec\\.ts$'] },
      to: { path: 'node_modules/stripe/' },
    },
    {
      name: 'only-authenticate-knows-passport',
      severity: 'error',
      from: { path: '^(api|seeds|server)', pathNot: ['^api/http/authenticate\\.ts$', '\\.spec\\.ts$'] },
      to: { path: 'node_modules/(@types/)?passport' },
    },
    {
      name: 'no-circles',
      severity: 'error',
      from: {},
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
    },
    {
      name: 'tests-stay-out-of-the-product',
      severity: 'error',
      from: { path: '^(src|api|shared|seeds|server)', pathNot: '\\.spec\\.ts$' },
      to: { path: '^test/' },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsConfig: { fileName: 'tsconfig.json' },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: { exportsFields: ['exports'], conditionNames: ['import', 'require', 'node', 'default', 'types'] },
  },
};
