import type { Cable, Device, Install } from '#core/install.ts'
import type { TopologyNode } from '#core/topology/topology.ts'

/** A device as the trade writes it: `B16`, `gG 35`. */
export const deviceName = ({ kind, curve, rated }: Device): string =>
  kind === 'breaker' ? `${curve}${rated}` : `${curve} ${rated}`

/** A cable as the trade writes it, with its length: `3G2.5, 18 m`. */
export function cableName({ cores, line, protective, length }: Cable): string {
  const type = `${cores}${protective === undefined ? 'X' : 'G'}${line}`
  return length === undefined ? type : `${type}, ${length} m`
}

const cut = (text: string, most: number): string => (text.length > most ? `${text.slice(0, most - 1)}…` : text)

/** What stands beside a node: its id first, then its rating and name. */
export function captionOf({ id, kind }: TopologyNode, install: Install): string[] {
  switch (kind) {
    case 'supply':
      return ['Grid', deviceName(install.supply.main_protection)]
    case 'board':
      return [id, cut(install.boards?.[id]?.name ?? '', 15)]
    case 'overcurrent device': {
      const device = install.overcurrent?.[id]?.device
      return [id, device ? deviceName(device) : '']
    }
    case 'changeover':
      return [id, `${install.changeover.poles}-pole ${install.changeover.rated_current} A`]
    case 'residual-current device': {
      const device = install.residual_current?.[id]
      return [id, device ? `${device.residual} mA ${device.type}${device.delay ?? ''}` : '']
    }
    case 'inverter':
      return [id, `${(install.inverters?.[id]?.rated_power ?? 0) / 1000} kVA`]
    case 'circuit': {
      const circuit = install.circuits?.[id]
      return circuit
        ? [
            id,
            `${cut(circuit.serves, 26)}`,
            `${deviceName(circuit.device)}, ${cableName(circuit.cable)}, ${circuit.phases.join(' ')}`,
          ]
        : [id]
    }
  }
}
