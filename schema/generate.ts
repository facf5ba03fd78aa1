import { writeFile } from 'node:fs/promises'
import openapiTypescript, { astToString, type OpenAPI3 } from 'openapi-typescript'
import { readExamples } from '../src/contract/examples.ts'
import { openapi } from '../src/contract/openapi.ts'
import { resolverTypes } from './generate-resolver-types.ts'

const head = '// Generated from schema/openapi.json by schema/generate.ts. Do not edit.\n'

/** Everything that is generated, by path from the root: the contract in other forms. */
export async function generated(): Promise<Readonly<Record<string, string>>> {
  const document = openapi(readExamples())
  // A field with a default may be left out of a request, so it is not promised there.
  const types = astToString(
    await openapiTypescript(document as unknown as OpenAPI3, { defaultNonNullable: false, immutable: true }),
  )
  return {
    'schema/openapi.json': `${JSON.stringify(document, null, 2)}\n`,
    'schema/openapi.d.ts': head + types,
    'src/graphql/resolver-types.ts': await resolverTypes(),
  }
}

if (import.meta.main) {
  for (const [path, text] of Object.entries(await generated()))
    await writeFile(new URL(`../${path}`, import.meta.url), text)
}
