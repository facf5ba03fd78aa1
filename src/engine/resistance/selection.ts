import { refuse } from '../faults.ts'
import type { Layer, Soil } from '../ground/profile-types.ts'
import { defaultMethod } from '../methods/defaults.ts'
import type { BaseMethod, ShaftMethod } from '../methods/method.ts'
import { baseMethods, shaftMethods } from '../methods/registry.ts'
import type { ResistanceJob } from './job.ts'

/** A method picked for a soil, with the settings of the request. */
export type Selected<M extends { readonly id: string } = { readonly id: string }> = {
  readonly method: M
  readonly settings: Readonly<Record<string, number | string>>
  readonly pointer: string
  readonly role: string
}

type Part = 'Shaft' | 'Base'

function select<M extends ShaftMethod | BaseMethod>(
  job: ResistanceJob,
  soil: Soil,
  part: Part,
  layerPointer: string,
  tables: Readonly<Record<string, Readonly<Record<string, M>>>>,
): Selected<M> {
  if (soil === 'rock')
    return refuse('method-not-applicable', layerPointer, {
      soil,
      part,
      reason: 'The layer is rock, and no method for rock is available yet',
    })
  const role = `${soil}${part}` as 'cohesiveShaft' | 'cohesiveBase' | 'granularShaft' | 'granularBase'
  const asked = job.methods[role]
  const pointer = `${job.at.methods}/${role}`
  const id =
    asked === undefined
      ? defaultMethod(role, job.pile.installation).id
      : typeof asked === 'string'
        ? asked
        : asked.method
  const table = tables[role]!
  const method = Object.hasOwn(table, id) ? table[id] : undefined
  if (!method) return refuse('unknown-method', pointer, { method: id, known: Object.keys(table) })
  if (asked === undefined) {
    const { reason } = defaultMethod(role, job.pile.installation)
    job.notice({ code: 'default-used', level: 'info', text: `${role}: ${id} was used. ${reason}` })
  }
  return { method, settings: typeof asked === 'object' ? asked : {}, pointer, role }
}

export const selectShaft = (job: ResistanceJob, layer: Layer, pointer: string) =>
  select<ShaftMethod>(job, layer.soil, 'Shaft', pointer, shaftMethods)
export const selectBase = (job: ResistanceJob, layer: Layer, pointer: string) =>
  select<BaseMethod>(job, layer.soil, 'Base', pointer, baseMethods)
