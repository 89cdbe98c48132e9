import type { Device } from '#core/install.ts'
import type { Scene } from './quantity.ts'

/** The nearest overcurrent device above a node, the node itself not counted; the main protection where there is none. */
export function upstreamDevice(id: string, { install, topology }: Scene): Device {
  const [nearest] = topology.overcurrentAbove(id)
  const device = nearest === undefined ? undefined : install.overcurrent?.[nearest]?.device
  return device ?? install.supply.main_protection
}
