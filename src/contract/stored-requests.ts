import { z } from 'zod'

export type ProjectRequest = { readonly title: string }
export const projectRequest = z.strictObject({ title: z.string().min(1).max(500) }) satisfies z.ZodType<ProjectRequest>

export const signatureRequest = z.strictObject({
  role: z.enum(['originator', 'checker', 'approver']).meta({ description: 'who signs in this order, each once' }),
  meaning: z.string().min(1).max(1000).meta({ description: 'what the signature says, in words' }),
})
