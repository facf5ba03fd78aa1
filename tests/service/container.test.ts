import { execFile } from 'node:child_process'
import { once } from 'node:events'
import { chmodSync, globSync, lstatSync, readdirSync } from 'node:fs'
import { copyFile, mkdtemp, readFile, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { basename, join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { promisify } from 'node:util'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { buildImage, type Image } from './build-image.ts'
import { isSent, readCommand, readDockerfile } from './dockerfile.ts'
import { endService, type Started, startService } from './start-service.ts'

const run = promisify(execFile)
const tree = fileURLToPath(new URL('../../', import.meta.url))
/** The user that runs the service where the test may choose one; nobody, on most systems. */
const user = process.getuid?.() === 0 ? { uid: 65534, gid: 65534 } : undefined

let folder: string
let node: string
let image: Image
let service: Started | undefined

/** Takes the right to write from all, or gives it back to the owner; everybody may read. */
function permit(root: string, write: boolean, except: readonly string[] = []): void {
  for (const path of [
    root,
    ...readdirSync(root, { recursive: true, encoding: 'utf8' }).map((name) => join(root, name)),
  ]) {
    const stat = lstatSync(path)
    if (stat.isSymbolicLink() || except.some((kept) => path.startsWith(kept))) continue
    const mode = stat.isDirectory() || (stat.mode & 0o100) !== 0 ? 0o555 : 0o444
    chmodSync(path, write ? mode | 0o200 : mode)
  }
}

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'kentledge-image-'))
  image = await buildImage(tree, folder, user)
  // The runtime lies where its user may read it, as in the base image.
  node = join(folder, basename(process.execPath))
  await copyFile(process.execPath, node)
  chmodSync(folder, 0o755)
  permit(
    image.files,
    false,
    image.volumes.map((v) => join(image.files, v)),
  )
  const data = Object.entries(image.env).filter(([, value]) => image.volumes.includes(value))
  service = await startService({
    command: readCommand(image.command).map((word) => (word === 'node' ? node : word)),
    cwd: join(image.files, image.workdir),
    env: { ...image.env, ...Object.fromEntries(data.map(([name, value]) => [name, join(image.files, value)])) },
    user,
  })
}, 180_000)

afterAll(async () => {
  await endService(service)
  permit(folder, true)
  await rm(folder, { recursive: true, force: true })
})

test('the image is of the runtime that the tests run on, and its user is not root', () => {
  expect(image.base).toMatch(new RegExp(`^node:${process.versions.node.split('.')[0]}-`))
  expect(image.user).toBe('node')
})

test('its files are what production needs: no development package, no test', () => {
  const files = join(image.files, image.workdir)
  const here = globSync(['node_modules/{fastify,vitest,typescript,vite}', 'tests', 'schema/*'], { cwd: files })
  expect(here.sort()).toEqual(['node_modules/fastify', 'schema/examples', 'schema/schema.graphql'])
})

test.runIf(process.platform !== 'win32')('nothing outside the data folder can be written', async () => {
  const attempt = (path: string) =>
    run(node, ['-e', `require('node:fs').writeFileSync(${JSON.stringify(path)}, '')`], { ...user }).then(
      () => 'written',
      (fault: { stderr: string }) => /EACCES/.exec(fault.stderr)?.[0],
    )
  expect(await attempt(join(image.files, image.workdir, 'src', 'new.ts'))).toBe('EACCES')
  expect(image.volumes).toHaveLength(1)
  expect(await attempt(join(image.files, image.volumes[0]!, 'new'))).toBe('written')
})

test('the health check passes, and fails where nobody listens', async () => {
  const [program, ...args] = readCommand(image.healthcheck)
  expect(program).toBe('node')
  const check = (port: string) =>
    run(node, args, { env: { PORT: port }, ...user }).then(
      () => 0,
      (fault: { code: number }) => fault.code,
    )
  expect(await check(new URL(service!.address).port)).toBe(0)
  expect(await check('9')).toBe(1)
})

test.for(['single-pile', 'assessment'])('it answers the example %s', async (example) => {
  const body = await readFile(join(image.files, image.workdir, `schema/examples/${example}.json`), 'utf8')
  const path = example === 'assessment' ? '/v1/assessments' : `/v1/${example}`
  const headers = { 'content-type': 'application/json' }
  const reply = await fetch(service!.address + path, { method: 'POST', headers, body })
  expect(reply.status).toBe(200)
  const { trace } = (await reply.json()) as { trace: { steps: unknown[] } }
  expect(trace.steps.length).toBeGreaterThan(10)
})

test('SIGTERM ends it with 0', async () => {
  const { child, log } = service!
  const exit = once(child, 'exit')
  child.kill('SIGTERM')
  expect(await exit, log()).toEqual([0, null])
})

test('what the reader of Dockerfiles does not understand is refused', async () => {
  expect(() => readDockerfile('COPY a b')).toThrow('COPY a b')
  expect(() => readCommand('node src/main.ts')).toThrow('not understood')
  expect(isSent('*\n!src\n', 'src/main.ts')).toBe(true)
  expect(isSent('*\n!src\n', 'srcs')).toBe(false)
  const odd = await mkdtemp(join(tmpdir(), 'kentledge-odd-'))
  await writeFile(join(odd, '.dockerignore'), '*\n!src\n')
  for (const [step, said] of [
    ['RUN curl example.org', 'no such step'],
    ['ADD a b', 'no such step'],
    ['COPY tests tests', 'hides tests'],
  ] as const) {
    await writeFile(join(odd, 'Dockerfile'), `FROM node:26-slim\n${step}\n`)
    await expect(buildImage(odd, join(odd, 'out'))).rejects.toThrow(said)
  }
  await rm(odd, { recursive: true })
})
