import type { Role } from '#core/policy/roles.ts'

/** Opens every account of the demonstration. A production server refuses to be seeded. */
export const DEMO_PASSWORD = 'fennmark demonstration'

export interface DemoPerson {
  readonly id: string
  readonly email: string
  readonly name: string
  readonly licence: string | null
  readonly roles: readonly Role[]
}

export interface DemoOrganisation {
  readonly id: string
  readonly name: string
  readonly address: string
  readonly mark: string
  readonly people: readonly DemoPerson[]
}

const at = (organisation: number, person: number): string =>
  `5ee0000${organisation}-0000-4000-8000-00000000000${person}`

/** Two contractors of the invented valley of Fennmark, with every role. */
export const ORGANISATIONS: readonly DemoOrganisation[] = [
  {
    id: at(1, 0),
    name: 'Alder Electrical',
    address: 'Lock Street 9, Fennmark',
    mark: 'ALDER',
    people: [
      { id: at(1, 1), email: 'fenn@alder.example', name: 'A. Fenn', licence: 'FM-1182', roles: ['installer'] },
      { id: at(1, 2), email: 'rushton@alder.example', name: 'J. Rushton', licence: 'FM-1240', roles: ['installer'] },
      { id: at(1, 3), email: 'holm@alder.example', name: 'S. Holm', licence: 'FM-0766', roles: ['reviewer'] },
      {
        id: at(1, 4),
        email: 'alder@alder.example',
        name: 'R. Alder',
        licence: 'FM-0907',
        roles: ['reviewer', 'installer'],
      },
      { id: at(1, 5), email: 'tarn@scheme.example', name: 'M. Tarn', licence: null, roles: ['auditor'] },
      { id: at(1, 6), email: 'weir@alder.example', name: 'K. Weir', licence: null, roles: ['administrator'] },
    ],
  },
  {
    id: at(2, 0),
    name: 'Tarn Side Installations',
    address: 'Quay Road 21, Fennmark',
    mark: 'TARN',
    people: [
      { id: at(2, 1), email: 'birk@tarnside.example', name: 'L. Birk', licence: 'FM-1301', roles: ['installer'] },
      { id: at(2, 2), email: 'moss@tarnside.example', name: 'E. Moss', licence: 'FM-1015', roles: ['reviewer'] },
      { id: at(2, 3), email: 'tarn@scheme.example', name: 'M. Tarn', licence: null, roles: ['auditor'] },
      { id: at(2, 4), email: 'lund@tarnside.example', name: 'P. Lund', licence: null, roles: ['administrator'] },
    ],
  },
]
