import { type Refused, refuse } from '#server/http/problems.ts'
import type { Call } from '#server/http/route.ts'
import { route } from '#server/http/route.ts'
import { CALIBRATION, INSTRUMENT_SCHEMA, presentInstrument } from '#server/presenters/instrument.ts'
import {
  findInstrument,
  type InstrumentFacts,
  type InstrumentRow,
  insertInstrument,
  insertInstrumentVersion,
  lockInstrument,
  retireInstrument,
} from '#server/queries/instruments.ts'

const NEEDED = ['kind', 'calibrated_on', 'due_on'] as const

const common = { tag: 'instruments', policy: { action: 'instrument.write' }, limit: 'write' } as const

const onOne = {
  ...common,
  load: ({ tx, actor, params }: Pick<Call<unknown, unknown, undefined>, 'tx' | 'actor' | 'params'>) =>
    lockInstrument(tx, actor.organisation, params['instrument'] ?? ''),
  version: ({ version }: InstrumentRow) => version,
} as const

interface Sent {
  readonly kind: string
  readonly calibrated_on: string
  readonly due_on: string
  readonly certificate?: string | undefined
  readonly uncertainty?: { readonly [kind: string]: number } | undefined
  readonly note?: string | undefined
}

function factsOf(sent: Sent): InstrumentFacts | Refused {
  const { kind, calibrated_on, due_on, certificate = '', uncertainty = {}, note = '' } = sent
  if (calibrated_on >= due_on)
    return refuse('bad-request', undefined, {
      errors: [{ pointer: '/due_on', message: 'A calibration falls due after the day on which it was made.' }],
    })
  return { kind, calibrated_on, due_on, certificate, uncertainty, note }
}

const shown = async ({ tx, actor }: Pick<Call<unknown, unknown, unknown>, 'tx' | 'actor'>, id: string) => {
  const row = await findInstrument(tx, actor.organisation, id)
  if (row === undefined) throw new Error('The instrument cannot be read back.')
  return { body: presentInstrument(row), version: row.version }
}

const createRoute = route({
  ...common,
  id: 'create-instrument',
  method: 'post',
  path: '/instruments',
  summary: 'Enters an instrument with its calibration',
  body: {
    type: 'object',
    properties: { serial: { type: 'string', pattern: '^\\S(.{0,98}\\S)?$' }, ...CALIBRATION },
    required: ['serial', ...NEEDED],
    additionalProperties: false,
  },
  answers: { 201: INSTRUMENT_SCHEMA },
  async run(call) {
    const { tx, actor, body, now } = call
    const facts = factsOf(body)
    if ('refused' in facts) return facts
    const by = { organisation: actor.organisation, person: actor.person, now }
    const id = await insertInstrument(tx, by, body.serial)
    if (id === undefined)
      return refuse('conflict', `There is an instrument with the serial number ${body.serial} already.`)
    await insertInstrumentVersion(tx, by, { id, version: 1, facts })
    return { ...(await shown(call, id)), status: 201, audit: { instrument: id, serial: body.serial, after: facts } }
  },
})

const versionRoute = route({
  ...onOne,
  id: 'write-instrument-version',
  method: 'post',
  path: '/instruments/:instrument/versions',
  summary: 'A new calibration, or a correction: the versions before stay readable',
  body: { type: 'object', properties: CALIBRATION, required: NEEDED, additionalProperties: false },
  answers: { 201: INSTRUMENT_SCHEMA },
  async run(call) {
    const { tx, actor, subject, body, now } = call
    if (subject.retired_at !== null) return refuse('conflict', 'This instrument is retired. Bring it back first.')
    const facts = factsOf(body)
    if ('refused' in facts) return facts
    const { instrument_id: id, kind, calibrated_on, due_on, certificate, uncertainty, note } = subject
    const by = { organisation: actor.organisation, person: actor.person, now }
    await insertInstrumentVersion(tx, by, { id, version: subject.version + 1, facts })
    const before = { kind, calibrated_on, due_on, certificate, uncertainty, note }
    return { ...(await shown(call, id)), status: 201, audit: { before, after: facts } }
  },
})

const retireRoute = route({
  ...onOne,
  id: 'retire-instrument',
  method: 'post',
  path: '/instruments/:instrument/retire',
  summary: 'Takes an instrument out of use, or brings it back; its record stays',
  body: {
    type: 'object',
    properties: { retired: { type: 'boolean' }, reason: { type: 'string', minLength: 1, maxLength: 500 } },
    required: ['retired', 'reason'],
    additionalProperties: false,
  },
  answers: { 200: INSTRUMENT_SCHEMA },
  async run(call) {
    const { tx, actor, subject, body, now } = call
    if (body.retired === (subject.retired_at !== null))
      return refuse('conflict', body.retired ? 'It is retired already.' : 'It is in use already.')
    await retireInstrument(tx, actor.organisation, subject.instrument_id, body.retired ? now : null)
    return { ...(await shown(call, subject.instrument_id)), audit: body }
  },
})

export const INSTRUMENT_WRITE_ROUTES = [createRoute, versionRoute, retireRoute]
