const PACKAGE = ['npm', 'npm-dev', 'npm-optional', 'npm-peer', 'npm-no-pkg', 'npm-unknown'];
const CORE = '^shared/(units|domain|rules|roles)/';
const PLATFORM = '^features/(ui|transport|forms)/';
const DOOR = '^features/[^/]+/index\\.tsx?$';
const LAUNCHER = '\\.mjs$';

/** @param {string} comment - what a newcomer reads when the rule says no */
const forbid = (name, comment, { from, to, ...more }) => ({
  name,
  comment,
  severity: 'error',
  from,
  to,
  ...more,
});

const demand = (name, comment, { module, to }) => ({
  name,
  comment,
  severity: 'error',
  module,
  to,
});

/** @type {import('dependency-cruiser').IConfiguration} */
module.exports = {
  forbidden: [
    forbid(
      'no-cycles',
      'Two files that need each other are one file, or need a third. Types may point back.',
      {
        from: {},
        to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
      },
    ),
    forbid(
      'no-feature-cycles',
      'Features point one way: a setup knows wheels, a wheel knows no setups.',
      {
        from: { path: '^features/[^/]+$' },
        to: { circular: true },
        scope: 'folder',
      },
    ),
    forbid(
      'unresolvable',
      'An import that leads nowhere fails here and not in front of a person.',
      {
        from: {},
        to: { couldNotResolve: true },
      },
    ),
    forbid(
      'shared-knows-nobody',
      'What is shared runs in browser, server and tests, so it may need none of them.',
      {
        from: { path: '^shared/' },
        to: { path: '^(app|features|api|db|assets|__tests__)/' },
      },
    ),
    forbid(
      'shared-core-has-no-packages',
      'Rules can be read and checked with nothing but the language at hand.',
      {
        from: { path: CORE },
        to: {
          dependencyTypes: [...PACKAGE, 'core'],
          pathNot: 'node_modules/(@types/)?convert-units/',
        },
      },
    ),
    forbid(
      'only-units-convert',
      'Rules compute in SI; converting is the business of units alone.',
      {
        from: { path: CORE, pathNot: '^shared/units/' },
        to: { path: 'node_modules/(@types/)?convert-units/' },
      },
    ),
    forbid(
      'shared-core-not-to-contracts',
      'What goes over the wire depends on the domain, never the reverse.',
      {
        from: { path: CORE },
        to: { path: '^shared/contracts/' },
      },
    ),
    forbid(
      'contracts-only-zod',
      'A contract is zod and the domain, so that both ends can read it.',
      {
        from: { path: '^shared/contracts/' },
        to: { dependencyTypes: [...PACKAGE, 'core'], pathNot: 'node_modules/zod/' },
      },
    ),
    forbid('app-only-composes', 'A route names a screen; data and rules are the feature’s.', {
      from: { path: '^app/' },
      to: { path: '^(api|db|shared)/' },
    }),
    forbid(
      'app-enters-by-screens',
      'Routes take a screen or a feature’s door, so that each loads apart.',
      {
        from: { path: '^app/' },
        to: { path: '^features/', pathNot: ['-screen\\.tsx$', DOOR, '^features/(ui|transport)/'] },
      },
    ),
    forbid(
      'app-few-packages',
      'Routes need the router and React; the root layout sets up what all screens share.',
      {
        from: { path: '^app/', pathNot: '^app/_layout\\.tsx$' },
        to: {
          dependencyTypes: PACKAGE,
          pathNot:
            'node_modules/(@types/react|expo-[^/]+|react|react-native|react-native-safe-area-context)/',
        },
      },
    ),
    forbid(
      'features-not-to-server-or-routes',
      'The browser reaches the server over HTTP, not by import.',
      {
        from: { path: '^features/' },
        to: { path: '^(app|api|db)/' },
      },
    ),
    forbid(
      'features-by-the-door',
      'Another feature is entered by its index.ts, where it says what it offers.',
      {
        from: { path: '^features/([^/]+)/' },
        to: { path: '^features/', pathNot: ['^features/$1/', PLATFORM, DOOR] },
      },
    ),
    forbid(
      'platform-features-know-no-others',
      'ui, forms and transport serve every feature and know none.',
      {
        from: { path: PLATFORM },
        to: { path: '^features/', pathNot: PLATFORM },
      },
    ),
    forbid('ui-has-no-domain', 'A primitive takes plain words and numbers and fits any screen.', {
      from: { path: '^features/ui/' },
      to: { path: '^shared/(rules|contracts|domain|roles)/' },
    }),
    forbid('browser-has-no-node', 'Node’s modules do not exist in a browser.', {
      from: { path: '^(app|features|shared)/' },
      to: { dependencyTypes: ['core'] },
    }),
    forbid('api-not-to-the-client', 'The server works without a screen.', {
      from: { path: '^api/' },
      to: { path: '^(app|features|assets)/' },
    }),
    forbid(
      'only-repositories-touch-db',
      'SQL stands in repositories; the composition hands them the database.',
      {
        from: {
          path: '^api/',
          pathNot: ['-(repository|mapping)\\.ts$', '^api/(composition|main)\\.ts$', LAUNCHER],
        },
        to: { path: ['^db/', 'node_modules/(@types/)?(drizzle-orm|pg)/'] },
      },
    ),
    forbid('services-know-no-http', 'A service can be called by a route, a job or a test alike.', {
      from: { path: '^api/.+-(service|repository|reader)\\.ts$' },
      to: { path: ['node_modules/(@types/)?(express|express-session|passport)/', '^api/http/'] },
    }),
    forbid(
      'routes-not-to-repositories',
      'A route that skips the service skips the role check and the trail.',
      {
        from: { path: '^api/.+-routes\\.ts$' },
        to: { path: '^api/.+-repository\\.ts$' },
      },
    ),
    forbid(
      'db-knows-nobody',
      'Tables may name what the domain names; rules and requests are above them.',
      {
        from: { path: '^db/' },
        to: { path: '^(app|features|api|assets|shared/(rules|contracts|roles))/' },
      },
    ),
    forbid('tests-stay-outside', 'What ships never needs a test to be there.', {
      from: { pathNot: '^__tests__/' },
      to: { path: '^__tests__/' },
    }),
    forbid('no-dev-dependencies', 'What ships needs what package.json lists as dependencies.', {
      from: { path: '^(app|features|api|db|shared)/' },
      to: {
        dependencyTypes: ['npm-dev'],
        dependencyTypesNot: ['type-only', 'npm'],
        pathNot: '/@types/',
      },
    }),
    forbid(
      'launchers-need-nothing-installed',
      'A launcher installs the packages, so it cannot import one.',
      {
        from: { path: LAUNCHER },
        to: { dependencyTypes: PACKAGE },
      },
    ),
  ],
  required: [
    demand('routes-validate', 'A routes file parses what it is sent with a contract.', {
      module: { path: '^api/.+-routes\\.ts$', pathNot: '^api/http/' },
      to: { path: '^shared/contracts/' },
    }),
    demand('services-check-roles', 'A service asks who may do a thing before it does it.', {
      module: { path: '^api/.+-(service|reader)\\.ts$' },
      to: { path: '^shared/roles/' },
    }),
    demand('services-leave-a-trail', 'A service writes the audit row of what it changes.', {
      module: { path: '^api/.+-service\\.ts$', pathNot: '^api/audit/' },
      to: { path: '^api/audit/' },
    }),
  ],
  options: {
    // Left out of the graph instead, packages would make every rule about them pass.
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '^(dist|\\.local|db/migrations)/' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
      mainFields: ['module', 'main', 'types'],
      extensions: ['.web.tsx', '.web.ts', '.tsx', '.ts', '.mjs', '.js', '.json', '.d.ts'],
    },
  },
};
