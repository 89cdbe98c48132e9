import type { PersonRow } from '#server/queries/people.ts'

export const PERSON_SCHEMA = {
  type: 'object',
  properties: {
    id: { type: 'string', format: 'uuid' },
    email: { type: 'string' },
    name: { type: 'string' },
    licence: { type: ['string', 'null'] },
    roles: { type: 'array', items: { type: 'string' } },
    active: { type: 'boolean' },
    invited: { type: 'boolean', description: 'Has not chosen a password yet.' },
    second_factor: { type: 'boolean' },
    version: { type: 'integer' },
  },
  required: ['id', 'email', 'name', 'licence', 'roles', 'active', 'invited', 'second_factor', 'version'],
} as const

/** A person as administrators see one: nothing that lets in. */
export const presentPerson = (row: PersonRow) => ({
  id: row.person_id,
  email: row.email,
  name: row.name,
  licence: row.licence,
  roles: row.roles,
  active: row.active,
  invited: !row.has_password,
  second_factor: row.second_factor,
  version: row.version,
})
