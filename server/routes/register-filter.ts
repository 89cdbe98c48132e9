import type { RegisterFilter } from '#server/queries/register-search.ts'

/** What the register can be narrowed by; the same for lists, tables and samples. */
export const REGISTER_FILTERS = {
  state: { type: 'string', enum: ['issued', 'replaced', 'withdrawn'] },
  from: { type: 'string', format: 'date-time', description: 'Issued at this moment or later' },
  to: { type: 'string', format: 'date-time', description: 'Issued before this moment' },
  search: {
    type: 'string',
    minLength: 1,
    maxLength: 100,
    description: 'Part of reference, title, place, grid operator or number',
  },
  prefix: { type: 'string', minLength: 1, maxLength: 40, description: 'How the number begins' },
} as const

interface Filters {
  readonly state?: RegisterFilter['state'] | undefined
  readonly from?: string | undefined
  readonly to?: string | undefined
  readonly search?: string | undefined
  readonly prefix?: string | undefined
}

export const filterOf = (organisation: string, { state, from, to, search, prefix }: Filters): RegisterFilter => ({
  organisation,
  ...(state === undefined ? {} : { state }),
  ...(from === undefined ? {} : { from }),
  ...(to === undefined ? {} : { to }),
  ...(search === undefined ? {} : { search }),
  ...(prefix === undefined ? {} : { prefix }),
})
