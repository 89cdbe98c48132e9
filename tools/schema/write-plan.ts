import type { Plan } from '#core/normalise/plan.ts'

/** The plan as a TypeScript module: each different part is one constant, and the parts refer to one another by name. */
export function writePlan(plan: Plan): string {
  const names = new Map<string, string>()
  const lines: string[] = []

  function constant(part: Plan): string {
    const text = textOf(part)
    const known = names.get(text)
    if (known) return known
    const name = `p${names.size}`
    names.set(text, name)
    lines.push(`const ${name}: Plan = ${text}`)
    return name
  }

  function textOf(part: Plan): string {
    if (part.as === 'quantity' || part.as === 'reading') return JSON.stringify(part)
    if (part.as === 'list' || part.as === 'map') return `{"as":"${part.as}","each":${constant(part.each)}}`
    const keys = Object.entries(part.keys).map(([key, inner]) => `${JSON.stringify(key)}:${constant(inner)}`)
    const defaults = part.defaults ? `,"defaults":${JSON.stringify(part.defaults)}` : ''
    return `{"as":"${part.as}","keys":{${keys.join(',')}}${defaults}}`
  }

  const top = constant(plan)
  const head = "import type { Plan } from '#core/normalise/plan.ts'\n"
  return `${head}\n${lines.join('\n')}\n\nexport const INSTALL_PLAN: Plan = ${top}\n`
}
