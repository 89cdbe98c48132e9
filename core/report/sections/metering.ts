import type { Block, Entry, Section } from '../blocks.ts'
import { verdictEntry } from '../entries.ts'
import { amount, amountOr, printed, readingWithUnit } from '../print.ts'
import type { ReportScene } from '../scene.ts'

function linkEntries(scene: ReportScene, id: string): Entry[] {
  const link = scene.install.meter?.link
  if (!link) return []
  const bus = `${id}/link`
  const bias = scene.number(id, 'bias_voltage')
  return [
    {
      anchor: `meter/${id}/link/kind`,
      term: 'Link',
      detail: link.kind,
      ...(link.address !== undefined && { note: `address ${link.address}` }),
    },
    {
      anchor: `meter/${id}/link/terminated`,
      term: 'Terminated at',
      detail: link.terminated_at?.join(' and ') ?? 'not stated',
    },
    {
      anchor: `meter/${id}/link/measured`,
      term: 'Across the pair',
      detail: readingWithUnit(link.measured_across, 'Ω', 0),
      note: `expected ${printed(scene.value(id, 'termination_expected'), 'Ω')}`,
    },
    ...(bias === undefined
      ? []
      : [{ anchor: `meter/${id}/link/bias`, term: 'Idle level', detail: amount(bias, 'mV') }]),
    {
      anchor: `meter/${id}/link/length`,
      term: 'Length',
      detail: amountOr(link.length, 'm', 'not stated'),
      ...(link.length_limit !== undefined && { note: `the datasheet allows ${amount(link.length_limit, 'm')}` }),
    },
    verdictEntry(`meter/${id}/link/verdict`, scene.verdicts.of(bus)),
  ]
}

/** The meter that steers the inverter, and the link between them. */
export function metering(scene: ReportScene): Section {
  const { meter } = scene.install
  const blocks: Block[] = []
  if (meter) {
    const { id, at, rated_current, direction, neutral_reference } = meter
    const entries: Entry[] = [
      { anchor: `meter/${id}/place`, term: 'Meter', detail: `${id}, at the ${at}` },
      { anchor: `meter/${id}/rated`, term: 'Rated current', detail: amountOr(rated_current, 'A', 'not stated') },
      { anchor: `meter/${id}/direction`, term: 'Direction', detail: direction ?? 'not stated' },
      {
        anchor: `meter/${id}/neutral`,
        term: 'Measuring neutral',
        detail: neutral_reference ?? 'not stated',
        note: 'where it is taken from',
      },
      verdictEntry(`meter/${id}/verdict`, scene.verdicts.of(id)),
    ]
    const link = linkEntries(scene, id)
    blocks.push({
      kind: 'particulars',
      anchor: `meter/${id}`,
      beside: link.length > 0,
      lists: [{ title: 'Meter', entries }, ...(link.length > 0 ? [{ title: 'Link', entries: link }] : [])],
    })
  }
  return { anchor: 'metering', title: 'Meter and link', blocks }
}
