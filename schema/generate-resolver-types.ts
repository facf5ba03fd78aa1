import { readFile, writeFile } from 'node:fs/promises'
import { codegen } from '@graphql-codegen/core'
import * as typescript from '@graphql-codegen/typescript'
import * as resolvers from '@graphql-codegen/typescript-resolvers'
import { parse } from 'graphql'

const target = new URL('../src/graphql/resolver-types.ts', import.meta.url)
const head = `// Generated from schema/schema.graphql by schema/generate-resolver-types.ts. Do not edit.
// biome-ignore-all lint: generated
// biome-ignore-all format: generated
// biome-ignore-all assist: generated
`

/** Types of inputs, outputs and resolvers, as the text of src/graphql/resolver-types.ts. */
export async function resolverTypes(): Promise<string> {
  const schema = parse(await readFile(new URL('./schema.graphql', import.meta.url), 'utf8'))
  const body = await codegen({
    filename: target.pathname,
    schema,
    documents: [],
    config: {
      useTypeImports: true,
      enumsAsTypes: true,
      immutableTypes: true,
      contextType: './context.ts#Context',
      mappers: {
        Project: '../operations/put-project.ts#ShownProject',
        Assessment: '../operations/show-record.ts#ShownRecord',
        Cap: '../operations/read-many.ts#CapNode',
        Changes: '../operations/changes-in-thread.ts#ToldChanges',
        Job: '../operations/show-job.ts#ShownJob',
        JobConnection: './nodes.ts#JobConnectionNode',
        CapAggregates: './nodes.ts#AggregateNode',
        ProjectConnection: './nodes.ts#ProjectConnectionNode',
        AssessmentConnection: './nodes.ts#AssessmentConnectionNode',
        CapConnection: './nodes.ts#CapConnectionNode',
        NeighbourConnection: './nodes.ts#NeighbourConnectionNode',
      },
      scalars: {
        Quantity: 'number | string',
        Varying: 'unknown',
        Count: 'number',
        MethodChoice: 'unknown',
        JSON: 'unknown',
      },
    },
    plugins: [{ typescript: {} }, { resolvers: {} }],
    pluginMap: { typescript, resolvers },
  })
  return `${head}${body.trimEnd()}\n`
}

if (import.meta.main) await writeFile(target, await resolverTypes())
