/** A thread that does as it is told: answers, sleeps, refuses or dies. */
export async function obey(task: { answer?: string; sleep?: number; refuse?: true; die?: true }): Promise<unknown> {
  if (task.die) process.exit(3)
  if (task.refuse) return { code: 'malformed-json', facts: { reason: 'told to' }, errors: [] }
  if (task.sleep) await new Promise((resolve) => setTimeout(resolve, task.sleep))
  return new TextEncoder().encode(task.answer ?? '')
}
