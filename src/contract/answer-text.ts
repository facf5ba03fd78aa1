type Answer = { readonly trace?: object | undefined }

/** An object as JSON, each of its values by a call of its own. */
const byValue = (node: object, print: (value: unknown) => string): string => {
  const fields = Object.entries(node).filter(([, value]) => value !== undefined)
  return `{${fields.map(([key, value]) => `${JSON.stringify(key)}:${print(value)}`).join(',')}}`
}

/**
 * The text of an answer, the same as `JSON.stringify` gives, which is the fastest serializer of replies of this size. But one
 * object of many keys, as `trace.results` is, makes it take its slow path for all of the call, so each part is printed alone.
 */
export const answerText = (answer: Answer): string =>
  byValue(answer, (part) => (part === answer.trace ? byValue(part as object, JSON.stringify) : JSON.stringify(part)))
