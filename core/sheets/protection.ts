import type { State } from '#core/glossary.ts'
import type { Circuit } from '#core/install.ts'
import type { Scene } from '#core/quantities/quantity.ts'

/** Ids of the residual-current protection that a fault current of the circuit passes in the state; its own device under its own id. */
export function residualIds(id: string, circuit: Circuit, { topology }: Scene, state: State): string[] {
  const upstream = topology.residualProtection(id, state)
  return circuit.residual_current && !upstream.includes(id) ? [...upstream, id] : [...upstream]
}

/** The lowest rated residual current (mA) among the protection of the circuit in the state; undefined where there is none. */
export function additionalResidual(id: string, circuit: Circuit, scene: Scene, state: State): number | undefined {
  const currents = residualIds(id, circuit, scene, state).flatMap((device) => {
    const protection = device === id ? circuit.residual_current : scene.install.residual_current?.[device]
    return protection ? [protection.residual] : []
  })
  return currents.length === 0 ? undefined : Math.min(...currents)
}
