/** What a file to start from is made of, as the person answered. */
export interface StartAnswers {
  readonly name: string
  readonly operator: string
  readonly earthing: string
  readonly phases: string
  readonly rating: string
  readonly rulebook: string
}

const quoted = (text: string): string => JSON.stringify(text)

/** A commented install file to start from: right in shape, its values to be replaced by those of the site. */
export function startFile({ name, operator, earthing, phases, rating, rulebook }: StartAnswers): string {
  const three = phases === '3'
  const [cable, kitchen] = three ? ['5G10', '5G6'] : ['3G10', '3G6']
  return `# yaml-language-server: $schema=install.draft-07.schema.json
# An install file. Numbers carry their unit; lines that begin with # are comments.
# Replace every value by that of your site. skerry check tells what is missing or wrong.
skerry: 1

report:
  reference: NEW-001
  purpose: initial verification          # initial verification | periodic verification | alteration
  rulebook: ${quoted(rulebook)}
  extent: Changeover, backed-up circuits, photovoltaics and battery.

site:
  name: ${quoted(name)}
  address: [ Street and number, Place ]
  lowest_temperature: -12 °C             # for the array's highest voltage
  premises: dwelling                     # dwelling | commercial | industrial | agricultural | public

supply:
  operator: ${quoted(operator)}
  earthing: ${earthing}
  nominal: { voltage: 230 V, phases: ${phases}, frequency: 50 Hz }
  main_protection: gG 63
  # loop_impedance: 0.24 ohm             # measured at the origin
  # fault_current: 2.1 kA                # the larger of line-neutral and line-earth
  separation: { required: all poles, stated_in: "ask the operator before you order the device" }

earthing:
  electrode: { kind: foundation }
  earthing_conductor: 16 mm²
  bonding:
    - { to: water pipe, size: 10 mm² }

boards:
  MB: { name: Main board, fed_from: supply }
  EB: { name: Backed-up board, fed_from: RCD1 }

overcurrent:
  F1: { device: gG ${rating}, breaking: 50 kA, fed_from: MB }

changeover:
  id: CO
  fed_from: F1
  operation: automatic
  poles: ${three ? 4 : 2}
  rated_current: ${rating} A
  neutral_link: closes in island         # closes in island | fixed | none
  interlock: [ electrical, mechanical ]
  cable: { type: ${cable}, insulation: xlpe, method: B2, length: 6 m }
  signals:
    - { role: changeover command, terminal: DO1, configured: DO1 }
    - { role: changeover confirmation, terminal: DI1, configured: DI1 }
    - { role: grid contactor open, terminal: DI2, configured: DI2 }

residual_current:
  RCD1: { fed_from: CO, type: A, rated_current: 40 A, residual: 30 mA }

inverters:
  INV:
    fed_from: CO.load                    # the backed-up side of the changeover
    phases: ${phases}
    rated_power: ${three ? 10 : 5} kVA
    island: { continuous: ${three ? 10 : 5} kVA, peak: ${three ? 12 : 6} kVA, fault_current: 40 A, shuts_down_within: 0.2 s }   # from the datasheet
    residual_monitoring: integrated
    # interface_protection: { u_high: 253 V, u_low: 184 V, f_high: 51.5 Hz, f_low: 47.5 Hz, reconnect_after: 60 s }   # as read back
    settings: { island_voltage: 230 V, held_back_charge: 40 %, low_charge_alarm: 20 % }

batteries:
  BAT: { into: INV, chemistry: lithium iron phosphate, usable: 9.6 kWh, max_discharge: 5 kW, efficiency: 95 %, place: utility room }

circuits:
  K1:
    serves: Sockets
    fed_from: EB
    phases: [ L1 ]
    device: { breaker: B16, breaking: 6 kA }
    cable: { type: 3G2.5, insulation: pvc, method: B2, length: 20 m }
    load: { power: 1.2 kW, daily_energy: 3 kWh }
    sockets: true
  K2:
    serves: Cooker                       # fed upstream of the changeover: on the grid only
    fed_from: MB
    phases: [ ${three ? 'L1, L2, L3' : 'L1'} ]
    device: { breaker: B20, breaking: 6 kA }
    cable: { type: ${kitchen}, insulation: pvc, method: C, length: 12 m }
    load: { power: 4 kW }

# The found half comes from the site. skerry fieldsheet prints a sheet to take along.
# instruments:
#   T1: { kind: multifunction installation tester, serial: "0417-A", calibrated: 2026-03-02, due: 2027-03-02 }
# readings:
#   with: T1
#   circuits:
#     K1: { continuity: 0.36 ohm, insulation: ">999 MΩ at 500 V", polarity: correct, loop: { grid: 0.61 ohm } }
`
}
