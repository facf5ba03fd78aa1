/** One line of a Dockerfile: `{ word: 'COPY', rest: 'src src' }`. */
export type Instruction = { readonly word: string; readonly rest: string }
export type Stage = { readonly base: string; readonly name: string; readonly instructions: readonly Instruction[] }

/** The stages of a Dockerfile, comments dropped and continued lines joined. */
export function readDockerfile(text: string): Stage[] {
  const lines = text
    .split('\n')
    .filter((line) => !/^\s*#/.test(line))
    .join('\n')
    .replace(/\\\n\s*/g, ' ')
    .split('\n')
    .map((line) => line.trim())
    .filter((line) => line !== '')
  const stages: { base: string; name: string; instructions: Instruction[] }[] = []
  for (const line of lines) {
    const [, word, rest] = /^(\w+)\s+(.*)$/.exec(line) ?? fail(line)
    const stage = stages.at(-1)
    if (word === 'FROM') {
      const [, base, name = ''] = /^(\S+)(?:\s+AS\s+(\S+))?$/i.exec(rest!) ?? fail(line)
      stages.push({ base: base!, name, instructions: [] })
    } else if (stage) stage.instructions.push({ word: word!, rest: rest! })
    else fail(line)
  }
  return stages
}

/** `A=1 B=2` of an ENV. */
export function readAssignments(rest: string): Record<string, string> {
  return Object.fromEntries(rest.split(/\s+/).map((pair) => /^([A-Z_]+)=(\S*)$/.exec(pair)?.slice(1) ?? fail(pair)))
}

/** The program and arguments of `CMD ["node", "src/main.ts"]`; the form that goes through a shell would swallow SIGTERM and is refused. */
export function readCommand(rest: string): string[] {
  const [, list] = /(\[.*\])\s*$/.exec(rest) ?? fail(rest)
  return JSON.parse(list!) as string[]
}

/** Whether the build may see a path of the tree, by a `.dockerignore` that hides all and then names what is let through. */
export function isSent(dockerignore: string, path: string): boolean {
  const patterns = dockerignore.split('\n').filter((line) => line.trim() !== '')
  if (patterns[0] !== '*') throw new Error('.dockerignore is expected to hide all first')
  return patterns.slice(1).some((p) => p.startsWith('!') && `${path}/`.startsWith(`${p.slice(1)}/`))
}

function fail(line: string): never {
  throw new Error(`not understood in the Dockerfile: ${line}`)
}
