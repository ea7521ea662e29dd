/**
 * Who may import whom: the table of DEVELOPERS.md as a rule, default deny.
 */

/** Where it holds; worker.ts, scripts, seeders, migrations and tests may import anything. */
export const governed = ['app', 'components', 'lib', 'models']
  .map((folder) => `${folder}/**/*.{ts,tsx}`)
  .concat('proxy.ts', 'instrumentation.ts')

/** A file belongs to the first zone that matches; present.ts is part of its noun besides. */
export const zones = [
  zone('color', 'lib/color/**'),
  zone('naming', 'lib/naming/**'),
  zone('auth', 'lib/auth/**'),
  zone('server', 'lib/server/**'),
  zone('jobs', 'lib/jobs/**'),
  zone('storage', 'lib/storage/**'),
  zone('env', 'lib/env.ts'),
  zone('errors', 'lib/errors.ts'),
  zone('logger', 'lib/logger.ts'),
  zone('schema', ['lib/*/schema.ts', 'lib/*/{constants,formats,wishes}.ts']),
  zone('present', 'lib/*/present.ts', { more: true }),
  // What goes out in a kit, from a description and nothing else.
  zone('exports', 'lib/exports/**'),
  zone('noun', 'lib/*/**'),
  zone('models', 'models/**'),
  // How yarn is drawn, as figures: what React, an SVG file and a PDF draw alike.
  zone('drawing', 'components/yarn/*.ts'),
  zone('components', 'components/**'),
  // A file of lib/ that the table does not know may neither import nor be imported.
  zone('unplaced', 'lib/*'),
  zone('app', ['app/**', 'proxy.ts', 'instrumentation.ts']),
]

const NEXT = ['next', 'next/**', 'next-auth', 'next-auth/**']
const FOUNDATION = ['env', 'errors', 'logger']
const SERVICES = ['auth', 'server', 'jobs', 'storage']
const DOMAIN = ['noun', 'schema', 'present', 'models', 'color', 'naming']

/** The options of boundaries/dependencies. */
export const importTable = {
  default: 'disallow',
  checkAllOrigins: true,
  checkUnknownLocals: true,
  checkInternals: true,
  message:
    'This may not be imported here: see "Who may import whom" in DEVELOPERS.md ({{from.file.path}} → {{dependency.source}}).',
  policies: [
    // lib/color: itself and pure packages, no Node.js
    from('color', local('color'), packages('culori', 'chroma-js', '@vibrant/quantizer-mmcq')),

    // lib/naming: itself, colour science and pure packages. It holds a dictionary of some megabytes,
    // so that the browser gets its types and its answers only.
    from(
      'naming',
      local('naming', 'color'),
      packages(
        'cmu-pronouncing-dictionary',
        'munkres',
        'obscenity',
        'retext-*',
        'unified',
        'vfile',
      ),
    ),

    from(
      'models',
      local('models', 'env', 'errors'),
      types('color', 'naming', 'schema'),
      packages('sequelize'),
      node(),
    ),

    // What a schema checks and the constants it speaks of are sent to the browser, whatever else is
    // beside them.
    from('schema', local('schema', 'color'), packages('zod')),
    from(
      'noun',
      local(...DOMAIN, ...FOUNDATION, 'auth', 'storage', 'jobs', 'exports'),
      anyPackageBut(...NEXT, 'react', 'react-dom'),
      node(),
    ),

    from('drawing', local('drawing', 'color')),
    from(
      'exports',
      local('exports', 'drawing', 'color', 'schema', 'noun'),
      packages('fontkit', 'pdfkit', 'fflate', 'sharp'),
      node(),
    ),

    from(['auth', 'server'], local(...DOMAIN, ...FOUNDATION, ...SERVICES), anyPackage(), node()),
    from(
      ['jobs', 'storage'],
      local(...DOMAIN, ...FOUNDATION, ...SERVICES),
      anyPackageBut(...NEXT),
      node(),
    ),
    from('env', packages('zod')),
    from('logger', local('env'), packages('pino')),

    from(
      'components',
      local('components', 'drawing', 'color', 'schema'),
      types('present', 'errors', 'naming'),
      anyPackage(),
    ),
    from(
      'app',
      local('app', 'noun', 'schema', 'present', 'auth', 'server', 'components', 'drawing'),
      anyPackageBut('sequelize', 'pg', 'pg-boss'),
    ),
  ],
}

function zone(category, pattern, { more = false } = {}) {
  return { category, pattern, stopMatching: !more }
}

function inZone(...categories) {
  return { file: { categories: { anyOf: categories.flat() } } }
}

function from(categories, ...allow) {
  return { from: inZone(categories), allow: allow.flat() }
}

function local(...categories) {
  return { to: inZone(categories) }
}

function types(...categories) {
  return { to: inZone(categories), dependency: { kind: 'type' } }
}

function packages(...names) {
  return { to: { module: { origin: 'external', source: names } } }
}

function anyPackage() {
  return { to: { module: { origin: 'external' } } }
}

function anyPackageBut(...names) {
  return { to: { module: { origin: 'external', source: `!{${names.join(',')}}` } } }
}

function node() {
  return { to: { module: { origin: 'core' } } }
}
