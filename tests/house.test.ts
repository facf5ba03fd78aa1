import { globSync, readFileSync } from 'node:fs'
import { posix } from 'node:path'
import ts from 'typescript'
import { expect, test } from 'vitest'

/**
 * The rooms of src/: floor, and what a room may look down to when it is less than all lower floors.
 * A file imports lower floors only; rooms of one floor are strangers.
 */
type Room = { readonly floor: number; readonly only?: readonly string[] }
const rooms: Readonly<Record<string, Room>> = {
  'engine/faults.ts': { floor: 0 },
  'engine/version.ts': { floor: 0 },
  'engine/quantities': { floor: 1, only: ['engine/faults.ts'] },
  'engine/numerics': { floor: 1, only: [] },
  'engine/sources': { floor: 1, only: [] },
  'engine/trace': { floor: 2 },
  'engine/ground': { floor: 3 },
  'engine/piles': { floor: 3 },
  'engine/design-basis': { floor: 3 },
  'engine/replay': { floor: 3, only: ['engine/trace/step.ts', 'engine/quantities', 'engine/faults.ts'] },
  'engine/notice.ts': { floor: 3 },
  'engine/requests.ts': { floor: 3 },
  'engine/methods': { floor: 4 },
  'engine/resistance': { floor: 5 },
  'engine/settlement': { floor: 5 },
  'engine/assessment': { floor: 6 },
  'engine/catalogue.ts': { floor: 7 },
  'engine/calculators.ts': { floor: 7 },
  'engine/index.ts': { floor: 8 },
  'errors.ts': { floor: 9, only: ['engine/faults.ts'] },
  'config.ts': { floor: 9, only: ['engine/faults.ts', 'engine/index.ts'] },
  'canonical.ts': { floor: 10, only: ['errors.ts'] },
  contract: { floor: 11, only: ['engine', 'errors.ts', 'canonical.ts'] },
  print: { floor: 11, only: ['engine', 'errors.ts'] },
  store: { floor: 11, only: ['engine', 'errors.ts', 'canonical.ts'] },
  jobs: { floor: 11, only: ['engine', 'errors.ts'] },
  operations: { floor: 12 },
  http: { floor: 13, only: ['operations', 'contract', 'print', 'errors.ts', 'engine'] },
  graphql: { floor: 13, only: ['operations', 'contract', 'errors.ts', 'engine'] },
  'app.ts': { floor: 14 },
  'main.ts': { floor: 15 },
  'keys.ts': { floor: 15, only: ['config.ts', 'store'] },
  'backup.ts': { floor: 15, only: ['config.ts', 'store'] },
}

/** Type imports that the table lets through: plain declarations of what a request or notice is, beside or above their reader. */
const openTypes: Readonly<Record<string, readonly string[]>> = {
  'engine/requests.ts': [
    'engine/ground/profile-types.ts',
    'engine/piles/pile-type.ts',
    'engine/piles/layout.ts',
    'engine/design-basis/design-basis.ts',
    'engine/methods/method-choice.ts',
  ],
}
/** Files of a floor that their own floor may read, for types only. */
const readableTypes = ['engine/notice.ts', 'engine/requests.ts', 'engine/piles/pile-type.ts']

/** Packages that the engine may import: it runs in a thread, a browser or a notebook alike. */
const enginePackages: Readonly<Record<string, readonly string[]>> = {
  mathjs: ['engine/trace', 'engine/replay'],
  temml: ['engine/trace'],
  'd3-delaunay': ['engine/assessment'],
}

/**
 * What breaks a law today, each with what mends it. The list is exact: a new breach fails, and so does a mended one that
 * still stands here.
 */
const debts: readonly string[] = []

type Import = { readonly from: string; readonly to: string; readonly typeOnly: boolean }
type Source = { readonly path: string; readonly text: string; readonly tree: ts.SourceFile }

const root = new URL('../src/', import.meta.url).pathname
const sources: readonly Source[] = globSync('**/*.ts', { cwd: root })
  .map((path) => path.replaceAll('\\', '/'))
  .sort()
  .map((path) => {
    const text = readFileSync(root + path, 'utf8')
    return { path, text, tree: ts.createSourceFile(path, text, ts.ScriptTarget.Latest, true) }
  })

function visit(node: ts.Node, see: (node: ts.Node) => void): void {
  see(node)
  node.forEachChild((child) => visit(child, see))
}

function importsOf({ path, tree }: Pick<Source, 'path' | 'tree'>): Import[] {
  const found: Import[] = []
  const add = (to: ts.Node | undefined, typeOnly: boolean) => {
    if (!to || !ts.isStringLiteralLike(to)) throw new Error(`${path} imports something that is not written out`)
    const target = to.text.startsWith('.') ? posix.join(posix.dirname(path), to.text) : to.text
    found.push({ from: path, to: target, typeOnly })
  }
  visit(tree, (node) => {
    if (ts.isImportDeclaration(node)) {
      const clause = node.importClause
      const named = clause?.namedBindings
      const eachType =
        named !== undefined &&
        ts.isNamedImports(named) &&
        named.elements.length > 0 &&
        named.elements.every((e) => e.isTypeOnly)
      add(
        node.moduleSpecifier,
        clause?.phaseModifier === ts.SyntaxKind.TypeKeyword || (eachType && clause?.name === undefined),
      )
    } else if (ts.isExportDeclaration(node) && node.moduleSpecifier) add(node.moduleSpecifier, node.isTypeOnly)
    else if (ts.isImportTypeNode(node))
      add(ts.isLiteralTypeNode(node.argument) ? node.argument.literal : undefined, true)
    else if (ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword)
      add(node.arguments[0], false)
  })
  return found
}

const imports = sources.flatMap(importsOf)
const isLocal = (to: string) => /^[^@].*\.ts$/.test(to)
const inside = (path: string, place: string) => path === place || path.startsWith(`${place}/`)
const roomOf = (path: string) => Object.keys(rooms).find((room) => inside(path, room))

/** Why an import breaks the table; undefined when it does not. */
function breach({ from, to, typeOnly }: Import): string | undefined {
  if (!isLocal(to)) {
    if (!inside(from, 'engine')) return undefined
    const rule = enginePackages[to]
    return rule?.some((room) => inside(from, room)) ? undefined : `the engine does not take ${to} here`
  }
  const [here, there] = [roomOf(from), roomOf(to)]
  if (!here || !there) return `${here ? to : from} is in no room of the table`
  if (here === there) return undefined
  if (typeOnly && openTypes[from]?.includes(to)) return undefined
  const [a, b] = [rooms[here]!, rooms[there]!]
  if (typeOnly && a.floor === b.floor && readableTypes.includes(to)) return undefined
  if (b.floor >= a.floor) return `floor ${a.floor} looks to floor ${b.floor}`
  if (a.only && !a.only.some((place) => inside(to, place))) return `${here} may not import ${there}`
  const entersEngine = !inside(from, 'engine') && inside(to, 'engine') && to !== 'engine/index.ts'
  if (entersEngine && !typeOnly && to !== 'engine/faults.ts') return 'only engine/index.ts is the door'
  return undefined
}

test('every import keeps to the table of rooms, but for the listed debts', () => {
  expect(sources.length).toBeGreaterThan(80)
  const found = imports.flatMap((i) => {
    const why = breach(i)
    return why ? [{ edge: `${i.from} -> ${i.to}`, why }] : []
  })
  expect(
    found.filter((f) => !debts.includes(f.edge)),
    'new breaches',
  ).toEqual([])
  expect(
    debts.filter((debt) => !found.some((f) => f.edge === debt)),
    'debts that are paid: strike them out',
  ).toEqual([])
})

test.each<[string, string, boolean]>([
  ['engine/trace/sheet.ts', 'engine/methods/method.ts', false],
  ['engine/ground/stress.ts', 'engine/piles/section.ts', true],
  ['engine/numerics/cholesky.ts', 'engine/faults.ts', false],
  ['engine/replay/replay.ts', 'engine/trace/compile.ts', false],
  ['engine/requests.ts', 'engine/methods/registry.ts', true],
  ['engine/requests.ts', 'engine/methods/method-choice.ts', false],
  ['engine/methods/method.ts', 'node:fs', false],
  ['engine/methods/method.ts', 'mathjs', false],
  ['http/probes.ts', 'engine/assessment/assess.ts', false],
  ['http/probes.ts', 'graphql/lists.ts', false],
  ['contract/parse.ts', 'http/problems.ts', false],
  ['store/records.ts', 'operations/calculate.ts', false],
  ['helpers/strings.ts', 'errors.ts', false],
])('the table refuses %s -> %s (type only: %s)', (from, to, typeOnly) => {
  expect(breach({ from, to, typeOnly })).toBeDefined()
})

test('the reader of imports sees each way to write one', () => {
  const text = `import type { A } from './a.ts'\nimport { type B, c } from './b.ts'\nimport { type D } from './d.ts'
export * from './e.ts'\nconst f = import('./f.ts')\ntype G = import('./g.ts').G\nimport './h.ts'`
  const tree = ts.createSourceFile('x/y.ts', text, ts.ScriptTarget.Latest, true)
  expect(importsOf({ path: 'x/y.ts', tree }).map((i) => [i.to, i.typeOnly])).toEqual([
    ['x/a.ts', true],
    ['x/b.ts', false],
    ['x/d.ts', true],
    ['x/e.ts', false],
    ['x/f.ts', false],
    ['x/g.ts', true],
    ['x/h.ts', false],
  ])
})

/** The first circle of a graph as a path, or none. */
function circle(edges: readonly Pick<Import, 'from' | 'to'>[]): string[] {
  const next = new Map<string, string[]>()
  for (const { from, to } of edges) next.set(from, [...(next.get(from) ?? []), to])
  const done = new Set<string>()
  const walk = (at: string, path: readonly string[]): string[] => {
    if (path.includes(at)) return [...path.slice(path.indexOf(at)), at]
    if (done.has(at)) return []
    for (const to of next.get(at) ?? []) {
      const found = walk(to, [...path, at])
      if (found.length > 0) return found
    }
    done.add(at)
    return []
  }
  for (const start of next.keys()) {
    const found = walk(start, [])
    if (found.length > 0) return found
  }
  return []
}

test('imports run in no circle, types included', () => {
  const edge = (from: string, to: string) => ({ from, to })
  expect(circle([edge('a', 'b'), edge('b', 'c'), edge('c', 'b')])).toEqual(['b', 'c', 'b'])
  expect(circle([edge('a', 'b'), edge('a', 'c'), edge('b', 'c')])).toEqual([])
  expect(circle(imports.filter((i) => isLocal(i.to)))).toEqual([])
})

const outsideWorld = ['Date', 'console', 'process', 'performance', 'fetch', 'setTimeout', 'setInterval', 'crypto']

/** Clock, randomness, logger, I/O and async in one file of the engine. */
function impurities({ path, tree }: Pick<Source, 'path' | 'tree'>): string[] {
  const found: string[] = []
  visit(tree, (node) => {
    const within = node.parent as ts.Node | undefined
    const isName =
      within !== undefined &&
      (ts.isPropertyAccessExpression(within) || ts.isPropertyAssignment(within)) &&
      within.name === node
    if (ts.isIdentifier(node) && !isName && outsideWorld.includes(node.text)) found.push(`${path}: ${node.text}`)
    if (ts.isPropertyAccessExpression(node) && node.getText() === 'Math.random') found.push(`${path}: Math.random`)
    if (node.kind === ts.SyntaxKind.AsyncKeyword || ts.isAwaitExpression(node)) found.push(`${path}: async`)
  })
  return found
}

test('the engine knows no clock, randomness, logger, I/O or async', () => {
  const text = 'const t = Date.now() + Math.random(); export async function f() { await g(); console.log(process) }'
  const tree = ts.createSourceFile('x.ts', text, ts.ScriptTarget.Latest, true)
  expect(impurities({ path: 'x.ts', tree })).toEqual(
    ['Date', 'Math.random', 'async', 'async', 'console', 'process'].map((what) => `x.ts: ${what}`),
  )
  expect(sources.filter((s) => inside(s.path, 'engine')).flatMap(impurities)).toEqual([])
})

test('no folder has a name that says nothing', () => {
  const empty = ['utils', 'util', 'helpers', 'common', 'shared', 'misc', 'core', 'lib', 'types']
  const folders = new Set(sources.flatMap((s) => s.path.split('/').slice(0, -1)))
  expect([...folders].filter((folder) => empty.includes(folder.toLowerCase()))).toEqual([])
})

test('export by name, and the engine has the only index file', () => {
  expect(sources.filter((s) => s.path.endsWith('index.ts')).map((s) => s.path)).toEqual(['engine/index.ts'])
  const defaults = sources.filter((s) =>
    s.tree.statements.some(
      (node) =>
        ts.isExportAssignment(node) ||
        (ts.canHaveModifiers(node) && node.modifiers?.some((m) => m.kind === ts.SyntaxKind.DefaultKeyword)),
    ),
  )
  expect(defaults.map((s) => s.path)).toEqual([])
})

test('only the programs read the environment', () => {
  expect(sources.filter((s) => /\bprocess\.env\b/.test(s.text)).map((s) => s.path)).toEqual([
    'backup.ts',
    'keys.ts',
    'main.ts',
  ])
})

test('what src/ imports is a runtime dependency: the container installs nothing else', () => {
  const { dependencies } = JSON.parse(readFileSync(`${root}../package.json`, 'utf8')) as { dependencies: object }
  const packages = imports.filter((i) => !isLocal(i.to) && !i.typeOnly && !i.to.startsWith('node:')).map((i) => i.to)
  expect(packages).toContain('fastify')
  const names = packages.map((to) => to.match(/^(@[^/]+\/)?[^/]+/)![0])
  expect([...new Set(names)].filter((name) => !Object.hasOwn(dependencies, name))).toEqual([])
})

/** Too long today: to be split. Exact, like the debts above. */
const toSplit: readonly string[] = []
/** Data, and what is generated. */
const tables = ['engine/sources/bibliography.ts', 'errors.ts', 'graphql/resolver-types.ts']

test('files stay under 300 lines, data and generated ones apart; names are kebab-case', () => {
  const long = sources.filter((s) => s.text.split('\n').length > 300 && !tables.includes(s.path))
  expect(long.map((s) => s.path)).toEqual(toSplit)
  expect(
    sources.map((s) => posix.basename(s.path)).filter((name) => !/^[a-z0-9]+(-[a-z0-9]+)*\.ts$/.test(name)),
  ).toEqual([])
})
