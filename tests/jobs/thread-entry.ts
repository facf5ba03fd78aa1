/** A thread that does as it is told: answers, sleeps, refuses, fails or dies. */
export async function obey(task: {
  answer?: string
  sleep?: number
  refuse?: true
  fail?: true
  die?: true
}): Promise<unknown> {
  if (task.die) process.exit(3)
  if (task.fail) throw new TypeError('a defect')
  if (task.refuse) return { refused: { code: 'malformed-json', facts: { reason: 'told to' }, errors: [] } }
  if (task.sleep) await new Promise((resolve) => setTimeout(resolve, task.sleep))
  return new TextEncoder().encode(task.answer ?? '')
}
