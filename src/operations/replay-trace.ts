import { hashOf } from '../canonical.ts'
import { parse } from '../contract/parse.ts'
import { replayRequest } from '../contract/replay.ts'
import { engineVersion, replay, usualCautions } from '../engine/index.ts'

/** Re-evaluates a trace and says which steps hold. */
export function replayTrace(input: unknown) {
  const { trace, request } = parse(replayRequest, input)
  const requestHash = hashOf({ trace, request })
  return {
    result: replay(trace, request),
    notices: [usualCautions],
    meta: { engine: engineVersion, requestHash },
  }
}
