import type { FaultCode } from './engine/faults.ts'

export type ErrorEntry = {
  readonly title: string
  readonly status: number
  readonly cause: string
  readonly cure: string
  readonly template: string
}

type Contract =
  | 'malformed-json'
  | 'malformed-url'
  | 'not-acceptable'
  | 'timed-out'
  | 'malformed-request'
  | 'headers-too-large'
  | 'request-timeout'
  | 'worker-died'
  | 'invalid-request'
  | 'unknown-field'
  | 'missing-field'
  | 'duplicate-field'
  | 'wrong-type'
  | 'out-of-range'
  | 'unknown-choice'
  | 'too-many-items'
  | 'too-few-items'
  | 'not-found'
  | 'method-not-allowed'
  | 'unsupported-media-type'
  | 'body-too-large'
  | 'overloaded'
  | 'internal-error'
  | 'csv-malformed'
  | 'loads-twice'
  | 'malformed-form'
  | 'not-unicode'
  | 'too-deep'
  | 'bad-query'
  | 'store-unavailable'
  | 'unauthenticated'
  | 'missing-scope'
  | 'no-such-project'
  | 'no-such-assessment'
  | 'no-such-cap'
  | 'no-assessment-yet'
  | 'bad-cursor'
  | 'not-comparable'
  | 'bad-project-slug'
  | 'precondition-failed'
  | 'precondition-required'
  | 'idempotency-mismatch'
  | 'idempotency-running'
  | 'bad-idempotency-key'
  | 'signature-step'
  | 'signature-same-person'
  | 'assessment-not-completed'
  | 'assessment-ended'
  | 'assessment-cancelled'
  | 'job-abandoned'
  | 'engine-refuses-record'
export type ErrorCode = FaultCode | Contract

const entry = (status: number, title: string, template: string, cause: string, cure: string): ErrorEntry => ({
  status,
  title,
  template,
  cause,
  cure,
})

/** One catalogue: code to title, status and template. `{x}` is a fact of the fault. Codes are never reused. */
export const catalogue: Readonly<Record<ErrorCode, ErrorEntry>> = {
  'malformed-json': entry(
    400,
    'The body is not JSON',
    'The body could not be read as JSON: {reason}.',
    'A comma, quote or bracket is missing, or the body is not JSON at all.',
    'Send a JSON document.',
  ),
  'malformed-request': entry(
    400,
    'The request cannot be read',
    'The request is no HTTP that this service reads: {reason}.',
    'The bytes sent are not a well-formed HTTP/1.1 request.',
    'Send the request with an HTTP client.',
  ),
  'headers-too-large': entry(
    431,
    'Header fields too large',
    'The header of the request is too large.',
    'The header fields together exceed 16 KiB.',
    'Send fewer or shorter header fields.',
  ),
  'request-timeout': entry(
    408,
    'Request timed out',
    'The request did not arrive in time.',
    'The client stopped sending before the request was whole.',
    'Send the whole request without pauses.',
  ),
  'timed-out': entry(
    504,
    'Timed out',
    'The work took longer than {seconds} s and was ended.',
    'The request is larger than this service finishes in its time.',
    'Split the schedule, or ask the operator for a larger WORK_TIMEOUT.',
  ),
  'worker-died': entry(
    503,
    'The worker was lost',
    'The thread that worked on this request ended before it was done.',
    'A defect or a lack of memory.',
    'Try again; report it if it stays.',
  ),
  'not-acceptable': entry(
    406,
    'Not acceptable',
    'No answer of this path is of the accepted types.',
    'The Accept header names types that this path does not answer in.',
    'Accept application/json; for pages and lists as files see the types of the path in /openapi.json.',
  ),
  'malformed-url': entry(
    400,
    'The URL cannot be read',
    'The URL could not be read: {reason}.',
    'The path holds a broken escape sequence.',
    'Percent-encode the path correctly.',
  ),
  'invalid-request': entry(
    422,
    'The request is invalid',
    'Faults found: {count}.',
    'One or more fields are wrong; `errors` lists them all.',
    'Mend every field that `errors` points at.',
  ),
  'unknown-field': entry(
    422,
    'Unknown field',
    'Unknown field "{field}".',
    'A field is misspelt or does not belong here.',
    'Remove or rename the field.',
  ),
  'duplicate-field': entry(
    422,
    'Field given twice',
    'The field "{field}" stands twice.',
    'One object holds the same name twice; which of the two holds would be a guess.',
    'Leave one of them out.',
  ),
  'missing-field': entry(
    422,
    'Missing field',
    'The field "{field}" is missing.',
    'A required field was left out.',
    'Add the field.',
  ),
  'wrong-type': entry(
    422,
    'Wrong type',
    'Expected {expected}, got {got}.',
    'A value is of another type.',
    'Send the expected type.',
  ),
  'out-of-range': entry(
    422,
    'Out of range',
    'The value must be {relation} {limit} {unit}; got {got}.',
    'A value lies outside what is physically possible or allowed.',
    'Send a value within the bounds.',
  ),
  'unknown-choice': entry(
    422,
    'Unknown choice',
    'Expected one of {options}; got {got}.',
    'A name is not in the list.',
    'Use one of the listed names.',
  ),
  'too-many-items': entry(
    422,
    'Too many items',
    'At most {limit} items are accepted; got {got}.',
    'A list is longer than the limit.',
    'Split the request.',
  ),
  'too-few-items': entry(
    422,
    'Too few items',
    'At least {limit} items are needed; got {got}.',
    'A list is too short.',
    'Add items.',
  ),
  'not-found': entry(
    404,
    'Not found',
    'There is nothing at {path}.',
    'The path or id does not exist.',
    'See /openapi.json for the paths.',
  ),
  'method-not-allowed': entry(
    405,
    'Method not allowed',
    '{path} does not answer to {method}.',
    'The path exists, with another method.',
    'Use a method that the Allow header lists.',
  ),
  'unsupported-media-type': entry(
    415,
    'Unsupported media type',
    'The content type {got} is not accepted here.',
    'The body is of another type.',
    'Send application/json.',
  ),
  'body-too-large': entry(
    413,
    'Body too large',
    'The body is larger than {limit} bytes.',
    'The body exceeds the limit of this service.',
    'Split the request, or ask the operator for a larger BODY_LIMIT.',
  ),
  overloaded: entry(
    503,
    'Overloaded',
    'The service is busy. Try again in {seconds} s.',
    'All workers are busy and the queue is full, or the service is stopping.',
    'Wait as Retry-After says.',
  ),
  'internal-error': entry(
    500,
    'Internal error',
    'Something failed inside the service.',
    'A defect of the service.',
    'Report it with the request id.',
  ),
  'csv-malformed': entry(
    422,
    'The CSV of loads is malformed',
    '{reason}.',
    'A column is missing or a cell is not a number.',
    'Mend the named row and column.',
  ),
  'loads-twice': entry(
    422,
    'Loads given twice',
    'The schedule holds rows of loads, and a CSV of loads came with it.',
    'Which of the two holds would be a guess.',
    'Leave `loads.rows` out of the schedule, or send no CSV.',
  ),
  'malformed-form': entry(
    400,
    'The form cannot be read',
    'The body could not be read as multipart/form-data: {reason}.',
    'The boundary is missing or the body ends early.',
    'Send the form with an HTTP client that writes the boundary itself.',
  ),
  'not-unicode': entry(
    422,
    'Text is not Unicode',
    'The text holds half of a surrogate pair.',
    'An escape such as \\ud800 stands alone; canonical JSON (RFC 8785) knows no such text.',
    'Send whole characters.',
  ),
  'too-deep': entry(
    422,
    'Nested too deep',
    'The request is nested too deep.',
    'Lists or objects stand within one another thousands of times.',
    'Send a flatter document.',
  ),
  'bad-query': entry(
    422,
    'Bad query parameter',
    'The query parameter {field} must be {expected}; got {got}.',
    'A query parameter has a value that is not known.',
    'Use a listed value.',
  ),
  'store-unavailable': entry(
    503,
    'The store cannot be used',
    'The store did not take the request; nothing was acknowledged.',
    'The disk is full or cannot be written, or the database server is not there.',
    'Try again; the operator finds the reason in the log.',
  ),
  unauthenticated: entry(
    401,
    'No valid key',
    'This service asks for a key: {reason}.',
    'The Authorization header is missing, or its key is unknown, expired or revoked.',
    'Send Authorization: Bearer with a key that the operator made.',
  ),
  'missing-scope': entry(
    403,
    'The key does not allow this',
    'The key lacks the scope {scope}.',
    'Each route needs scopes; the key was made without this one.',
    'Ask the operator for a key with this scope.',
  ),
  'no-such-project': entry(
    404,
    'No such project',
    'There is no project "{slug}", or the key has no right to it.',
    'The slug is misspelt, the project was not made yet, or it belongs to others.',
    'See GET /v1/projects.',
  ),
  'no-such-assessment': entry(
    404,
    'No such assessment',
    'There is no assessment {id}, or the key has no right to its project.',
    'The id is misspelt, or the record belongs to another project.',
    'See GET /v1/projects/{slug}/assessments.',
  ),
  'no-assessment-yet': entry(
    404,
    'No assessment yet',
    'The project "{slug}" has no assessment yet.',
    'No schedule was posted to the project.',
    'Post one to /v1/projects/{slug}/assessments.',
  ),
  'no-such-cap': entry(
    404,
    'No such cap',
    'The assessment has no cap "{mark}".',
    'The mark is misspelt or not percent-encoded.',
    'See the caps of the assessment.',
  ),
  'bad-cursor': entry(
    422,
    'Bad cursor',
    'The cursor does not belong to this list.',
    'A cursor was changed, or comes from a list with other filters.',
    'Start again without a cursor.',
  ),
  'not-comparable': entry(
    422,
    'Not comparable',
    'The assessment cannot be compared: {reason}.',
    'Changes are told between two revisions of one project.',
    'Send `since` with the id of another revision of the same project.',
  ),
  'bad-project-slug': entry(
    422,
    'Bad project slug',
    '"{got}" is no slug: 1 to 64 of a-z, 0-9 and -, with a letter or digit at both ends.',
    'The slug is part of addresses and stays for ever.',
    'Choose a slug of the allowed letters.',
  ),
  'precondition-failed': entry(
    412,
    'Precondition failed',
    'The resource is not in the state that the request expects; its ETag is now {etag}.',
    'It was changed since it was read, or it exists already.',
    'Read it again and decide anew.',
  ),
  'precondition-required': entry(
    428,
    'Precondition required',
    'A change needs If-Match with the ETag that was read.',
    'Without it a change by somebody else would be lost.',
    'Read the resource and send its ETag as If-Match.',
  ),
  'idempotency-mismatch': entry(
    422,
    'The key stands for another request',
    'This Idempotency-Key was used with another request.',
    'One key was used for two different requests.',
    'Use a new key for a new request.',
  ),
  'idempotency-running': entry(
    409,
    'The first request is still running',
    'A request with this Idempotency-Key is still running.',
    'A retry came before the first request was answered.',
    'Wait as Retry-After says and try again.',
  ),
  'bad-idempotency-key': entry(
    422,
    'Bad Idempotency-Key',
    'An Idempotency-Key has 1 to 255 printable ASCII characters.',
    'The header is empty, too long, or holds other characters.',
    'Send a UUID.',
  ),
  'signature-step': entry(
    409,
    'Not the next signature',
    'The next signature is that of the {next}; got {role}.',
    'Originator, checker and approver sign in this order, each once.',
    'Let the missing role sign first.',
  ),
  'signature-same-person': entry(
    409,
    'The same person signed before',
    '{actor} signed as {role} already.',
    'Originator, checker and approver are three different people.',
    'Let somebody else sign.',
  ),
  'assessment-not-completed': entry(
    409,
    'Assessment not completed',
    'Assessment {id} is {state}.',
    'What was asked for exists once the assessment is completed.',
    'Read GET /v1/assessments/{id}: it tells the state, and the reason where the assessment failed.',
  ),
  'assessment-ended': entry(
    409,
    'The assessment has ended',
    'Assessment {id} is {state}; only one that waits or runs can be cancelled.',
    'The assessment ended before the request; a completed one is never deleted.',
    'Nothing is to be done.',
  ),
  'assessment-cancelled': entry(
    409,
    'The assessment was cancelled',
    'The assessment was cancelled before it was completed.',
    'Somebody with a right to the project cancelled it.',
    'Post the schedule again.',
  ),
  'job-abandoned': entry(
    500,
    'The assessment was given up',
    'The assessment was begun {attempts} times and never came to its end. {reason}',
    'Each time the worker or the service itself was lost, or the time ran out.',
    'Split the schedule, or tell the operator the trace id.',
  ),
  'engine-refuses-record': entry(
    409,
    'The engine refuses the stored request',
    'The running engine refuses the request of this record: {reason}.',
    'The rules of requests have changed since the record was made.',
    'Recompute it with the engine that the record names.',
  ),
  'wrong-dimension': entry(
    422,
    'Wrong dimension',
    'Read "{got}", expected a quantity in {expected}.',
    'The unit measures something else.',
    'Use a unit of the expected dimension.',
  ),
  'unknown-unit': entry(
    422,
    'Unknown unit',
    'The unit of "{got}" is not known; expected a quantity in {expected}.',
    'The unit is misspelt or not supported.',
    'Use a listed unit.',
  ),
  'not-a-number': entry(
    422,
    'Not a number',
    'Read "{got}", expected a number in {expected}.',
    'Text stands where a number belongs.',
    'Send a number, or a string such as "600 mm".',
  ),
  'unknown-method': entry(
    422,
    'Unknown method',
    'There is no method "{method}" here; known: {known}.',
    'The id is misspelt or belongs to another part.',
    'See /v1/methods.',
  ),
  'method-not-applicable': entry(
    422,
    'Method not applicable',
    '{reason}.',
    'The method does not cover this soil or value.',
    'Choose another method for this layer.',
  ),
  'missing-parameter': entry(
    422,
    'Missing parameter',
    'Layer "{layer}" lacks {parameter}, which {method} needs.',
    'The chosen or default method needs a parameter that the request does not give.',
    'Give the parameter, or choose another method.',
  ),
  'no-layer': entry(
    422,
    'No layer',
    'The ground profile has no layer.',
    'The list of layers is empty.',
    'Add at least one layer.',
  ),
  'missing-thickness': entry(
    422,
    'Missing thickness',
    'Layer "{layer}" needs a thickness.',
    'Only the last layer may leave its thickness out, and not where a parameter varies from top to bottom.',
    'Add the thickness.',
  ),
  'pile-below-known-ground': entry(
    422,
    'Pile below the known ground',
    'The toe stands at {toeDepth} m; the ground is known to {knownDepth} m.',
    'The last layer has a thickness, so the known ground ends there.',
    'Shorten the pile, add a layer, or leave out the thickness of the last layer.',
  ),
  'toe-in-uncovered-soil': entry(
    422,
    'Toe in soil that no method covers',
    'No base method covers {soil}.',
    'The toe stands in soil without a method.',
    'Move the toe or choose another soil kind.',
  ),
  'section-impossible': entry(
    422,
    'Impossible section',
    '{reason}.',
    'The dimensions of the section contradict one another.',
    'Mend the section.',
  ),
  'piles-overlap': entry(
    422,
    'Piles overlap',
    'Piles {first} and {second} stand {spacing} m apart and are {width} m wide.',
    'Two piles would stand in one place.',
    'Increase the spacing.',
  ),
  'piles-too-close': entry(
    422,
    'Piles too close for the method',
    'The closest piles stand {spacing} m apart, less than {limit} m (1.5 diameters), which {method} cannot answer for.',
    'Piles are taken as lines of load beside one another; closer than 1.5 diameters that is no longer so.',
    'Increase the spacing, or ask for the settlement by randolph-wroth-1978.',
  ),
  'load-beyond-resistance': entry(
    422,
    'Load beyond the resistance',
    'The load of {load} {unit} exceeds the {resistance} {unit} that the softening pile or group can carry.',
    'With nonlinearity "hyperbolic" the settlement grows without limit towards the ultimate resistance.',
    'Reduce the load, add piles, or leave nonlinearity out for the elastic settlement.',
  ),
  'too-many-piles': entry(
    422,
    'Too many piles',
    'The layout has {got} piles; at most {limit} are accepted.',
    'The layout is larger than the limit.',
    'Split the cap.',
  ),
  'unknown-reference': entry(
    422,
    'Unknown reference',
    'There is no {kind} "{name}"; known: {known}.',
    'A name refers to nothing in the schedule.',
    'Correct the name or add what it refers to.',
  ),
  'duplicate-mark': entry(
    422,
    'Duplicate mark',
    'The mark "{mark}" stands twice.',
    'Two caps share one mark.',
    'Give each cap its own mark.',
  ),
  'duplicate-row': entry(
    422,
    'Duplicate row',
    'Cap "{cap}" has a second row for combination "{combination}"; the first is row {first}.',
    'Two rows name the same cap and combination; which of them holds would be a guess, and so would their sum.',
    'Leave one row for each cap and combination.',
  ),
  'missing-combination': entry(
    422,
    'Missing combination',
    'The design basis is checked with {needed} combinations; the schedule has {found}.',
    'The limit states do not fit the format of safety.',
    'Export the combinations that the design basis needs.',
  ),
  'missing-load': entry(
    422,
    'Missing load',
    'Cap "{cap}" has no row for combination "{combination}".',
    'A reaction is missing.',
    'Export the row.',
  ),
  'limit-state-mismatch': entry(
    422,
    'Limit state does not fit the design basis',
    '{reason}.',
    'Factored loads against an overall factor count safety twice; unfactored ones against partial factors not at all.',
    'Send combinations of the needed limit state.',
  ),
  'line-cannot-take-moment': entry(
    422,
    'A line of piles cannot take this moment',
    'The piles stand in one line and cannot take a moment of {moment} kN.m about it.',
    'A moment acts about the axis of a single line of piles.',
    'Add piles beside the line, or take the moment by other means.',
  ),
  'no-design-basis-support': entry(
    422,
    'Design basis not supported',
    '{format} is not supported yet.',
    'The format of safety has no factor set here.',
    'Use a supported format.',
  ),
  'wrong-load-components': entry(
    422,
    'Wrong load components',
    'With signs "{signs}" a row has {expected}.',
    'The row has the components of another sign convention.',
    'Send the components that the signs ask for.',
  ),
  'not-finite': entry(
    422,
    'The numbers run away',
    'The value of {symbol} is not finite.',
    'The given numbers lead to a division by zero or an overflow.',
    'Check the magnitude of the input.',
  ),
}

export type ProblemError = {
  readonly pointer: string
  readonly code: ErrorCode
  readonly detail: string
  readonly [fact: string]: unknown
}

const shown = (fact: unknown): string =>
  Array.isArray(fact)
    ? fact.join(', ')
    : typeof fact === 'number'
      ? String(Number(fact.toPrecision(6)))
      : fact === undefined
        ? ''
        : String(fact)

/** The sentence of a fault: the template with its facts. */
export const detailOf = (code: ErrorCode, facts: Readonly<Record<string, unknown>>): string =>
  catalogue[code].template
    .replaceAll(/( ?)\{(\w+)\}/g, (_, gap: string, name: string) =>
      // A ratio has no unit to show.
      name === 'unit' && facts[name] === '1' ? '' : gap + shown(facts[name]),
    )
    .replaceAll(/ +([;.])/g, '$1')

/** A problem that is told to the caller (RFC 9457). */
export class Problem extends Error {
  readonly code: ErrorCode
  readonly errors: readonly ProblemError[]
  readonly facts: Readonly<Record<string, unknown>>
  constructor(code: ErrorCode, facts: Readonly<Record<string, unknown>> = {}, errors: readonly ProblemError[] = []) {
    super(detailOf(code, facts))
    this.name = 'Problem'
    this.code = code
    this.facts = facts
    this.errors = errors
  }

  get status(): number {
    return catalogue[this.code].status
  }

  get document() {
    const { title, status } = catalogue[this.code]
    return {
      type: `/problems/${this.code}`,
      title,
      status,
      detail: this.message,
      ...(this.errors.length > 0 && { errors: this.errors }),
    }
  }
}

export const problemError = (
  pointer: string,
  code: ErrorCode,
  facts: Readonly<Record<string, unknown>> = {},
): ProblemError => ({
  pointer,
  code,
  detail: detailOf(code, facts),
  ...facts,
})

/** One problem of all faults: `invalid-request`, each fault with its own code. */
export function problemOf(errors: readonly ProblemError[]): Problem {
  return new Problem('invalid-request', { count: errors.length }, errors)
}
