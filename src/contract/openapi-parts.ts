/** Pieces that paths of the document are made of. */
export const schemaRef = (id: string) => ({ $ref: `#/components/schemas/${id}` })

export const json = (id: string, description: string, headers?: object) => ({
  description,
  ...(headers && { headers }),
  content: { 'application/json': { schema: schemaRef(id) } },
})

export const problem = (description: string) => ({
  description,
  content: { 'application/problem+json': { schema: schemaRef('Problem') } },
})

export const query = (name: string, description: string) => ({
  name,
  in: 'query',
  description,
  schema: { type: 'string' },
})

export const inPath = (name: string, description: string) => ({
  name,
  in: 'path',
  required: true,
  description,
  schema: { type: 'string' },
})

export const header = (description: string) => ({ description, schema: { type: 'string' } })

export const scheduleForm = {
  schema: {
    type: 'object',
    required: ['schedule', 'loads'],
    properties: {
      schedule: { description: 'JSON without `loads.rows`', type: 'string' },
      loads: { description: 'CSV with a header', type: 'string' },
    },
  },
}
