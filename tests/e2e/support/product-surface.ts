import { existsSync, readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'

import ts from 'typescript'

/** What can be asked of the product, by the names that the access matrix uses. */
export interface Surface {
  /** The pattern of a page's address (`/[brand]/lines/[line]`) → its path in the build. */
  pages: Map<string, string>
  /** A method and the pattern of a route's address: `GET /api/brands/[brand]/photographs/states`. */
  routes: Set<string>
  /** The export of a 'use server' file → its id in the build and the pages that may send it. */
  actions: Map<string, { id: string | null; pages: string[] }>
}

const METHODS = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS']
/** Made by the framework itself; they are what is answered to an address that is nothing. */
const FRAMEWORK = ['/_not-found', '/_global-error']

/**
 * Everything that can be asked, out of the sources and out of the production build: what stands in
 * one of them only is named as well.
 * @throws Error when two actions have one name, since the matrix could not tell them apart
 */
export function findSurface(dist: string): Surface {
  const surface: Surface = { pages: new Map(), routes: new Set(), actions: new Map() }
  for (const file of sourcesIn('app')) {
    const page = /^app(\/.*)?\/page\.tsx?$/.exec(file)
    if (page) surface.pages.set(patternOf(page[1] ?? ''), `app${page[1] ?? ''}/page`)
    const route = /^app(\/.*)\/route\.tsx?$/.exec(file)
    if (route) {
      const methods = exportsOf(file).filter((name) => METHODS.includes(name))
      for (const method of methods) surface.routes.add(`${method} ${patternOf(route[1]!)}`)
    }
  }
  for (const path of Object.keys(readJson<object>(dist, 'app-paths-manifest.json'))) {
    const [, folder, kind] = /^(.*)\/(page|route)$/.exec(path)!
    const pattern = patternOf(folder!)
    if (FRAMEWORK.includes(pattern)) continue
    if (kind === 'page') surface.pages.set(pattern, `app${path}`)
    // Its methods are in its source; what has none (an icon) answers GET.
    else if (![...surface.routes].some((route) => route.endsWith(` ${pattern}`)))
      surface.routes.add(`GET ${pattern}`)
  }
  // The framework's other router, which this product does not use.
  for (const path of Object.keys(readJson<object>(dist, 'pages-manifest.json')))
    if (!/^\/(_app|_document|_error|404|500)$/.test(path)) surface.pages.set(path, `pages${path}`)
  findActions(surface, dist)
  return surface
}

interface ActionManifest {
  node: Record<string, ManifestAction>
  edge: Record<string, ManifestAction>
}
interface ManifestAction {
  exportedName: string
  filename: string
  workers: Record<string, unknown>
}

function findActions({ actions }: Surface, dist: string): void {
  const manifest = readJson<ActionManifest>(dist, 'server-reference-manifest.json')
  const files = new Map<string, string>()
  const add = (name: string, file: string, id: string | null, pages: string[]) => {
    const known = files.get(name)
    if (known && known !== file) throw new Error(`${known} and ${file} both export ${name}.`)
    files.set(name, file)
    actions.set(name, { id, pages })
  }
  // What no page uses is not in the build today, and may be tomorrow.
  for (const file of ['app', 'components', 'lib'].flatMap(sourcesIn))
    if (isServerFile(file)) for (const name of exportsOf(file)) add(name, file, null, [])
  for (const [id, action] of Object.entries({ ...manifest.node, ...manifest.edge }))
    add(action.exportedName, action.filename, id, Object.keys(action.workers))
}

/** `/(studio)/[brand]/@side/lines` → `/[brand]/lines`. */
function patternOf(folder: string): string {
  const segments = folder.split('/').filter((one) => one && !/^(\(.*\)|@.*)$/.test(one))
  return `/${segments.join('/')}`
}

function sourcesIn(folder: string): string[] {
  return readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((file) => /\.tsx?$/.test(file))
    .map((file) => join(folder, file))
}

function parse(file: string): ts.SourceFile {
  return ts.createSourceFile(file, readFileSync(file, 'utf8'), ts.ScriptTarget.Latest, true)
}

function isServerFile(file: string): boolean {
  const [first] = parse(file).statements
  return (
    first !== undefined &&
    ts.isExpressionStatement(first) &&
    ts.isStringLiteral(first.expression) &&
    first.expression.text === 'use server'
  )
}

/** The names of what a file exports as values. */
function exportsOf(file: string): string[] {
  return parse(file).statements.flatMap((statement) => {
    if (ts.isExportDeclaration(statement) && !statement.isTypeOnly) {
      const { exportClause } = statement
      // What `export *` lets out cannot be seen from here.
      if (!exportClause || !ts.isNamedExports(exportClause)) return [`* of ${file}`]
      return exportClause.elements.filter((one) => !one.isTypeOnly).map(({ name }) => name.text)
    }
    if (ts.isExportAssignment(statement)) return ['default']
    if (!ts.canHaveModifiers(statement)) return []
    const modifiers = ts.getModifiers(statement)?.map(({ kind }) => kind) ?? []
    if (!modifiers.includes(ts.SyntaxKind.ExportKeyword)) return []
    if (modifiers.includes(ts.SyntaxKind.DefaultKeyword)) return ['default']
    if (ts.isFunctionDeclaration(statement)) return [statement.name!.text]
    if (!ts.isVariableStatement(statement)) return []
    return statement.declarationList.declarations.flatMap(({ name }) =>
      ts.isIdentifier(name)
        ? [name.text]
        : name.elements.flatMap((one) =>
            ts.isBindingElement(one) && ts.isIdentifier(one.name) ? [one.name.text] : [],
          ),
    )
  })
}

function readJson<T>(dist: string, name: string): T {
  const path = join(dist, 'server', name)
  if (!existsSync(path)) throw new Error(`The build has no ${path}.`)
  return JSON.parse(readFileSync(path, 'utf8')) as T
}
