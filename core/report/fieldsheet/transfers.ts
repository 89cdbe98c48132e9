import { LINES } from '#core/glossary.ts'
import type { Transfer } from '#core/install/readings.ts'
import type { Block } from '../blocks.ts'
import { rounded } from '../print.ts'
import type { ReportScene } from '../scene.ts'
import { sure } from '../sure.ts'
import { plainPoints } from './plain.ts'
import type { Point } from './points.ts'

function transferOf({ install }: ReportScene, to: Transfer['to']): Transfer | undefined {
  return install.readings?.transfers?.find((transfer) => transfer.to === to)
}

function toIsland(scene: ReportScene): Point[] {
  const found = transferOf(scene, 'island')
  const reason = found?.not_tested === undefined ? undefined : { not_tested: found.not_tested }
  const poles = [...LINES.slice(0, scene.install.supply.nominal.phases), 'N'] as const
  return [
    {
      anchor: 'point/transfer/island/dark',
      name: 'Supply opened upstream; until dark',
      unit: 's',
      limit: 'write it down',
      measured: found?.dark_after ?? reason,
      least: 0,
    },
    {
      anchor: 'point/transfer/island/restored',
      name: 'Until supply is restored',
      unit: 's',
      limit: 'after it was dark',
      measured: found?.restored_after ?? reason,
      least: 0,
    },
    ...poles.map((pole) => ({
      anchor: `point/transfer/island/terminal/${pole}`,
      name: `Left on the grid terminal ${pole}`,
      unit: 'V',
      limit: '≤ 50 V, and no more than a trace',
      measured: found?.grid_terminals?.[pole] ?? reason,
      least: 0,
    })),
  ]
}

function toGrid(scene: ReportScene): Point[] {
  const found = transferOf(scene, 'grid')
  const reason = found?.not_tested === undefined ? undefined : { not_tested: found.not_tested }
  const waits = scene.topology.inverters.island.flatMap((id) => scene.number(id, 'reconnect_after') ?? [])
  return [
    {
      anchor: 'point/transfer/grid/observed',
      name: 'Grid back; until the transfer',
      unit: 's',
      limit: waits.length === 0 ? 'write it down' : `≥ ${rounded(Math.max(...waits), 0)} s, as set`,
      measured: found?.observed ?? reason,
      least: 0,
    },
    {
      anchor: 'point/transfer/grid/gap',
      name: 'Interruption at the transfer',
      unit: 's',
      limit: 'write it down',
      measured: found?.gap ?? reason,
      least: 0,
    },
  ]
}

function steps(scene: ReportScene): Point[] {
  const { install, topology } = scene
  const done = install.readings?.load_steps ?? []
  const floors = [
    rounded(install.supply.nominal.voltage * 0.85, 1),
    rounded(install.supply.nominal.frequency * 0.98, 1),
  ]
  const starting = topology.circuits.backedUp.filter((id) => (install.circuits?.[id]?.load?.start ?? 1) > 1)
  const wanted =
    done.length > 0
      ? []
      : starting.length > 0
        ? starting.map((id) => `${sure(install.circuits?.[id], id).serves} started`)
        : ['Largest load started']
  const step = (anchor: string, name: string, read: (typeof done)[number] | undefined): Point[] => {
    const reason = read?.not_tested === undefined ? undefined : { not_tested: read.not_tested }
    return [
      {
        anchor: `${anchor}/voltage`,
        name: `${name}: lowest voltage`,
        unit: 'V',
        limit: `≥ ${floors[0]} V`,
        measured: read?.lowest_voltage ?? reason,
        least: 0,
      },
      {
        anchor: `${anchor}/frequency`,
        name: `${name}: lowest frequency`,
        unit: 'Hz',
        limit: `≥ ${floors[1]} Hz`,
        measured: read?.lowest_frequency ?? reason,
        least: 1,
      },
    ]
  }
  return [
    ...done.flatMap((read, index) => step(`point/load-step/${index + 1}`, read.step, read)),
    ...wanted.flatMap((name, index) => step(`point/load-step/wanted/${index + 1}`, name, undefined)),
  ]
}

/** What is read while the changeover works, and when loads start in the island. */
export function transferPoints(scene: ReportScene): Block[] {
  return [
    ...plainPoints(
      'point/transfer/island',
      'Grid fails: open the supply upstream of the changeover, never at the inverter',
      toIsland(scene),
    ),
    ...plainPoints('point/load-step', 'Loads started in the island', steps(scene)),
    ...plainPoints('point/transfer/grid', 'Grid returns', toGrid(scene)),
  ]
}
