import { randomUUID } from 'node:crypto'
import type { Response, Test } from 'supertest'
import supertest from 'supertest'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { ROLES, type Role } from '#core/policy/roles.ts'
import { REPORT_STATES, type ReportState } from '#core/policy/states.ts'
import type { Route } from '#server/http/route.ts'
import { ROUTES } from '#server/routes/all.ts'
import { ACCESS, type Cell } from './access.ts'
import { namesOf, openScene, type Scene, type Side } from './access-scene.ts'
import { type Browser, source } from './house.ts'

let scene: Scene

beforeAll(async () => {
  scene = await openScene()
}, 120_000)
afterAll(() => scene.house.close())
beforeEach(async () => {
  await scene.house.services.db('rate_limits').delete()
})

const QUERIES: Readonly<Record<string, string>> = {
  'create-report': '?file_name=a.skerry.yaml',
  'create-revision': '?file_name=a.skerry.yaml',
  'compare-revisions': '?from=1&to=1',
  'show-consistency': '?from=1&to=2',
}

const BODIES = {
  source: () => ['application/yaml', source('tern-farm-tt')] as const,
  chunk: () => ['application/octet-stream', Buffer.alloc(10)] as const,
}

const cellOf = ({ id }: Route): Cell => {
  const cell = ACCESS[id]
  if (cell === undefined) throw new Error(`tests/server/access.ts has no line for ${id}.`)
  return cell
}

/** The path with ids where it names something; what is not given names nothing. */
function pathOf(route: Route, names: Readonly<Record<string, string>>): string {
  const fixed: Record<string, string> = { revision: '1', offset: '0', sha256: 'a'.repeat(64) }
  const path = route.path.replaceAll(/:(\w+)/g, (_whole, name: string) => names[name] ?? fixed[name] ?? randomUUID())
  return `/api${path}${QUERIES[route.id] ?? ''}`
}

/** A request that is sound in form, but names no version: where one is needed, 428 says that everything before it passed. */
function dress(request: Test, route: Route): Test {
  if (route.method === 'get') return request
  const needsKey = 'idempotency' in route && route.idempotency === 'required'
  const keyed = needsKey ? request.set('idempotency-key', randomUUID()) : request
  if (route.accepts === undefined || route.accepts === 'json') {
    const body = cellOf(route).body ?? (route.body === undefined ? undefined : {})
    return body === undefined ? keyed : keyed.send(body)
  }
  const [type, bytes] = BODIES[route.accepts]()
  return keyed.set('content-type', type).send(bytes)
}

const call = async (browser: Browser, route: Route, names: Readonly<Record<string, string>>): Promise<Response> =>
  await dress(browser[route.method](pathOf(route, names)), route)

/** Whoever signs out is signed in again: the cells do not lean on each other. */
const browserFor = async (side: Side, role: Role, route: Route): Promise<Browser> =>
  route.id === 'sign-out' ? await scene.house.signIn(side.browsers[role].member) : side.browsers[role]

type Expected = 'passes' | 401 | 403 | 404 | 409

function expected(cell: Cell, role: Role, state: ReportState | undefined): readonly Expected[] {
  const { roles, states, auditorSees } = cell
  if (cell.public === true) return ['passes']
  const sees = role !== 'auditor' || auditorSees === undefined || (state !== undefined && auditorSees.includes(state))
  if (!roles.includes(role) || !sees) return cell.hidden === true || cell.absent === true ? [403, 404] : [403]
  if (cell.absent === true) return [404, 'passes']
  return states === undefined || state === undefined || states.includes(state) ? ['passes'] : [409]
}

function judged(answer: Response, route: Route, wanted: readonly Expected[]): boolean {
  const { status } = answer
  if (wanted.some((one) => one === status)) return true
  if (!wanted.includes('passes')) return false
  if (route.method !== 'get' && route.version !== undefined) return status === 428
  // Told by the trade itself (a wrong password, a file that is known) and not for want of a right.
  return ![401, 403, 404].includes(status) || (cellOf(route).public === true && status === 401)
}

const statesFor = ({ subject }: Cell): readonly (ReportState | undefined)[] =>
  subject === 'report' ? REPORT_STATES : [undefined]

/** Things that hang on a report are made on one in this state. */
const STATE_OF: Readonly<Partial<Record<string, ReportState>>> = {
  upload: 'draft',
  attachment: 'draft',
  thread: 'in review',
  draft: 'in review',
}

const told = (answer: Response): string => `${answer.status} ${answer.text?.slice(0, 200) ?? ''}`

describe('the matrix', () => {
  it('has a line for every route, and no other', () => {
    expect(Object.keys(ACCESS).toSorted()).toEqual(ROUTES.map(({ id }) => id).toSorted())
  })

  it('opens without signing in what it says, and nothing else', () => {
    const open = ROUTES.filter(({ policy }) => policy === 'public').map(({ id }) => id)
    expect(open.filter((id) => ACCESS[id]?.public !== true)).toEqual([])
  })
})

describe.each(ROUTES.map((route) => [route.id, route] as const))('%s', (_id, route) => {
  const cell = cellOf(route)

  it('asks for a sign-in, unless it is public', async () => {
    const answer = await dress(supertest(scene.house.app)[route.method](pathOf(route, {})), route)
    if (cell.public === true) expect(answer.status).not.toBe(403)
    else expect(told(answer)).toMatch(/^401 /)
  })

  it.each(ROLES.flatMap((role) => statesFor(cell).map((state) => [role, state] as const)))(
    'for %s, with a report that is %s',
    async (role, state) => {
      const { house, ours } = scene
      const names = cell.subject === undefined ? {} : await namesOf(house, ours, cell.subject, state)
      const answer = await call(await browserFor(ours, role, route), route, names)
      const wanted = expected(cell, role, state ?? STATE_OF[cell.subject ?? ''])
      expect(judged(answer, route, wanted) ? 'as written' : `${told(answer)} instead of ${wanted}`).toBe('as written')
    },
  )

  it.runIf(cell.fourEyes)('keeps out who had a hand in the report, role or not', async () => {
    const { house, ours } = scene
    const names = await namesOf(house, ours, cell.subject ?? 'report', cell.states?.[0] ?? 'in review')
    expect(told(await call(ours.hand, route, names))).toMatch(/^403 /)
  })

  it.runIf(cell.subject)('answers for another organisation’s object as for none', async () => {
    const { house, ours, theirs } = scene
    const names = await namesOf(house, theirs, cell.subject ?? 'report', cell.states?.[0] ?? 'issued')
    for (const role of ROLES) {
      const theirsSeen = await call(ours.browsers[role], route, names)
      const none = await call(ours.browsers[role], route, {})
      expect([role, theirsSeen.status]).toEqual([role, 404])
      expect(withoutId(theirsSeen)).toEqual(withoutId(none))
    }
  })
})

/** Everything that a client sees, but for the request's own id and the hour. */
function withoutId({ status, headers, text }: Response): unknown {
  const { 'x-request-id': id = '', date: _date, ...rest } = headers
  return { status, headers: rest, text: text.replaceAll(id, 'ID') }
}
