/** What a person may be in an organisation; one person may be several. */
export const ROLES = ['installer', 'reviewer', 'auditor', 'administrator'] as const
export type Role = (typeof ROLES)[number]

/** Who acts: a person of one organisation, as far as decisions need to know. */
export interface Actor {
  readonly person: string
  readonly organisation: string
  readonly roles: readonly Role[]
  /** As entered in install files under `people`, for telling whether the person tested what is judged. */
  readonly name: string
  readonly licence: string | null
}
