import { execFile } from 'node:child_process'
import { chown, cp, mkdir, readFile } from 'node:fs/promises'
import { basename, join, posix } from 'node:path'
import { promisify } from 'node:util'
import { isSent, readAssignments, readDockerfile, type Stage } from './dockerfile.ts'

const run = promisify(execFile)

/** A folder made by the steps of a Dockerfile, with what the container would be started by. */
export type Image = {
  readonly base: string
  /** The folder that stands for `/` of the container. */
  readonly files: string
  readonly workdir: string
  readonly env: Readonly<Record<string, string>>
  readonly volumes: readonly string[]
  readonly user: string
  readonly command: string
  readonly healthcheck: string
}

/**
 * Follows the steps of the Dockerfile in clean folders, one a stage, without a container engine. The base image is not
 * fetched: npm of this machine installs, from the lock file. A step that it does not know is refused, so that none is
 * passed over in silence.
 */
export async function buildImage(tree: string, into: string, owner?: { uid: number; gid: number }): Promise<Image> {
  const ignore = await readFile(join(tree, '.dockerignore'), 'utf8')
  const stages = readDockerfile(await readFile(join(tree, 'Dockerfile'), 'utf8'))
  const image = {
    base: '',
    files: '',
    workdir: '/',
    env: {} as Record<string, string>,
    volumes: [] as string[],
    user: 'root',
    command: '',
    healthcheck: '',
  }
  const folderOf = (stage: Stage) => join(into, stage.name || 'last')
  for (const stage of stages) {
    Object.assign(image, { base: stage.base, files: folderOf(stage), workdir: '/', env: {}, volumes: [], user: 'root' })
    Object.assign(image, { command: '', healthcheck: '' })
    await mkdir(image.files, { recursive: true })
    for (const { word, rest } of stage.instructions) {
      const inside = (path: string) => join(image.files, posix.resolve(image.workdir, path))
      if (word === 'WORKDIR') {
        image.workdir = posix.resolve(image.workdir, rest)
        await mkdir(inside('.'), { recursive: true })
      } else if (word === 'COPY') await copy(rest, inside)
      else if (word === 'RUN') await runStep(rest, inside, owner)
      else if (word === 'ENV') Object.assign(image.env, readAssignments(rest))
      else if (word === 'VOLUME') image.volumes.push(rest)
      else if (word === 'USER') image.user = rest
      else if (word === 'CMD') image.command = rest
      else if (word === 'HEALTHCHECK') image.healthcheck = rest
      else if (word !== 'EXPOSE') throw new Error(`no such step is known here: ${word} ${rest}`)
    }
  }
  return image

  async function copy(rest: string, inside: (path: string) => string): Promise<void> {
    const words = rest.split(/\s+/)
    const from = words[0]!.startsWith('--from=') ? words.shift()!.slice('--from='.length) : undefined
    const target = words.pop()!
    const source = from === undefined ? undefined : stages.find((stage) => stage.name === from)
    if (from !== undefined && !source) throw new Error(`COPY from a stage that is not there: ${from}`)
    for (const path of words) {
      if (!source && !isSent(ignore, path)) throw new Error(`.dockerignore hides ${path} from the build`)
      const to = target.endsWith('/') ? join(inside(target), basename(path)) : inside(target)
      await cp(source ? join(folderOf(source), path) : join(tree, path), to, {
        recursive: true,
        verbatimSymlinks: true,
      })
    }
  }
}

async function runStep(
  step: string,
  inside: (path: string) => string,
  owner: { uid: number; gid: number } | undefined,
): Promise<void> {
  const folder = /^install -d -o node -g node (\/\S+)$/.exec(step)?.[1]
  if (folder !== undefined) {
    await mkdir(inside(folder), { recursive: true })
    if (owner) await chown(inside(folder), owner.uid, owner.gid)
  } else if (step.startsWith('npm ci ')) {
    // What an outer `npm test` tells about its own package is none of this one's.
    const told = /^(npm_(package|lifecycle|command|config_(local_)?prefix)|NODE_ENV$|INIT_CWD$)/
    const env = Object.fromEntries(Object.entries(process.env).filter(([name]) => !told.test(name)))
    await run('npm', [...step.split(' ').slice(1), '--prefer-offline'], { cwd: inside('.'), env, timeout: 180_000 })
  } else throw new Error(`no such step is known here: RUN ${step}`)
}
