import { type ChildProcess, fork } from 'node:child_process'
import { once } from 'node:events'

/** A service in a process of its own, so that those who ask share no event loop with those who answer. */
export type Served = { readonly url: string; readonly stop: () => Promise<void> }

/** Posts a schedule and reads the whole answer; gives its status. */
export async function assess(url: string, body: string): Promise<number> {
  const answer = await fetch(`${url}/v1/assessments?trace=none`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body,
  })
  await answer.arrayBuffer()
  return answer.status
}

const entry = new URL('./serve.ts', import.meta.url)

export async function serve(env: Readonly<Record<string, string>> = {}): Promise<Served> {
  const child: ChildProcess = fork(entry, { env: { ...process.env, ...env } })
  const [url] = (await once(child, 'message')) as [string]
  return {
    url,
    stop: async () => {
      child.kill('SIGKILL')
      await once(child, 'exit')
    },
  }
}
