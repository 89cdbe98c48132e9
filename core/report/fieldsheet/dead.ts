import { type Block, type Row, tables } from '../blocks.ts'
import { rowsByFeeder } from '../by-board.ts'
import { distinct } from '../names.ts'
import { amountOr, rounded } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { plainPoints } from './plain.ts'
import { pointCell, wordCell } from './points.ts'

const WIDTH = { continuity: 21, insulation: 24, polarity: 21 } as const

function circuitRow(scene: ReportScene, id: string, serves: string): Row {
  const read = scene.install.readings?.circuits?.[id]
  const skipped = read?.not_tested === undefined ? undefined : { not_tested: read.not_tested }
  const expected = scene.number(id, 'continuity_expected')
  const voltage = amountOr(scene.number(id, 'insulation_test_voltage'), 'V')
  return {
    anchor: `point/circuit/${id}/dead`,
    head: { text: id },
    cells: [
      { text: serves },
      pointCell(
        {
          anchor: `point/circuit/${id}/continuity`,
          name: `continuity of ${id}`,
          unit: 'Ω',
          limit: expected === undefined ? 'write it down' : `about ${rounded(expected, 2)}`,
          measured: read?.continuity ?? skipped,
          least: 2,
        },
        WIDTH.continuity,
      ),
      pointCell(
        {
          anchor: `point/circuit/${id}/insulation`,
          name: `insulation of ${id}`,
          unit: 'MΩ',
          limit: `≥ ${amountOr(scene.number(id, 'insulation_minimum'), '')} at ${voltage}`,
          measured: read?.insulation ?? skipped,
          least: 0,
        },
        WIDTH.insulation,
      ),
      wordCell(
        {
          anchor: `point/circuit/${id}/polarity`,
          name: `polarity of ${id}`,
          word: read?.polarity ?? skipped?.not_tested,
          limit: 'correct',
        },
        WIDTH.polarity,
      ),
    ],
  }
}

function earthingPoints(scene: ReportScene): Block[] {
  const { electrode, bonding = [] } = scene.install.earthing ?? {}
  const names = distinct(bonding.map(({ to }) => to))
  const limit = scene.number('earthing', 'electrode_limit')
  return plainPoints('point/earthing', 'Earthing', [
    ...(electrode
      ? [
          {
            anchor: 'point/earthing/electrode',
            name: `Electrode, ${electrode.kind}`,
            unit: 'Ω',
            limit: limit === undefined ? 'write it down' : `≤ ${rounded(limit, 0)} Ω`,
            measured: electrode.resistance,
            least: 1,
          },
        ]
      : []),
    ...bonding.map(({ to, continuity }, index) => ({
      anchor: `point/bonding/${names[index]}`,
      name: `Bonding to ${to}`,
      unit: 'Ω',
      limit: 'as low as its length allows',
      measured: continuity,
      least: 2,
    })),
  ])
}

function busPoints(scene: ReportScene): Block[] {
  const { meter } = scene.install
  if (meter?.link?.kind !== 'RS-485') return []
  const expected = scene.number(meter.id, 'termination_expected')
  return plainPoints('point/bus', 'Link of the meter', [
    {
      anchor: `point/meter/${meter.id}/link`,
      name: 'Across the pair, power off',
      unit: 'Ω',
      limit: expected === undefined ? 'write it down' : `about ${rounded(expected, 0)} Ω`,
      measured: meter.link.measured_across,
      least: 0,
    },
  ])
}

/** What is read with everything off. */
export function deadPoints(scene: ReportScene): Block[] {
  const circuits = tables(
    'point/dead',
    [
      { label: 'Circuit', width: 9 },
      { label: 'Serves', width: 25 },
      { label: 'R_1 + R_2', unit: 'Ω', width: WIDTH.continuity },
      { label: 'Insulation', unit: 'MΩ', width: WIDTH.insulation },
      { label: 'Polarity', width: WIDTH.polarity },
    ],
    rowsByFeeder(scene, (id, { serves }) => circuitRow(scene, id, serves)),
    'Circuits',
  )
  return [...earthingPoints(scene), ...circuits, ...busPoints(scene)]
}
