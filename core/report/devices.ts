import type { Cable, Device, ResidualProtection } from '#core/install.ts'
import { amount } from './print.ts'

/** `B16`, `gG 35`. */
export function deviceName({ kind, curve, rated }: Device): string {
  return kind === 'fuse' ? `${curve} ${rated}` : `${curve}${rated}`
}

/** A device with its breaking capacity: `gG 35, 50 kA`. */
export function deviceText(device: Device, breaking: number | undefined = device.breaking): string {
  const name = device.kind === 'fuse' ? `fuse ${deviceName(device)}\u00a0A` : `breaker ${deviceName(device)}`
  return breaking === undefined ? name : `${name}, ${amount(breaking, 'A')}`
}

/** `3G2.5`, or `2.5 + 2.5 + 1.5 mm²` where the conductors differ. */
export function cableName({ line, neutral, protective, cores, material }: Cable): string {
  const metal = material === 'aluminium' ? ' Al' : ''
  const same = (neutral ?? line) === line && (protective ?? line) === line
  if (same) return `${cores}${protective === undefined ? '×' : 'G'}${line}${metal}`
  const parts = [line, neutral, protective].filter((size) => size !== undefined)
  return `${parts.join(' + ')}\u00a0mm²${metal}`
}

/** How a cable is laid: `PVC, B2, 18 m`. */
export function cableLaid({ insulation, method, length, ambient, grouped }: Cable): string {
  return [
    ...(insulation === undefined ? [] : [insulation.toUpperCase()]),
    ...(method === undefined ? [] : [`method ${method}`]),
    ...(length === undefined ? [] : [amount(length, 'm')]),
    ...(ambient === undefined ? [] : [amount(ambient, '°C')]),
    ...(grouped === undefined ? [] : [`${grouped.circuits} ${grouped.as}`]),
  ].join(', ')
}

/** `A 30 mA`, `B 300 mA S`. */
export function residualName({ type, residual, delay }: ResidualProtection): string {
  return `${type} ${amount(residual, 'mA')}${delay === undefined ? '' : ` ${delay}`}`
}
