/** A name as one part of a JSON Pointer (RFC 6901). */
export const escapePointer = (name: string): string => name.replaceAll('~', '~0').replaceAll('/', '~1')

/** A name as one part of a step id: ids are paths too. */
export const idPart = escapePointer
