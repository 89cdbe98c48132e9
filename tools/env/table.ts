import { ENV_SCHEMA } from '#server/env.ts'

interface Setting {
  readonly type?: string
  readonly enum?: readonly string[]
  readonly default?: unknown
  readonly minimum?: number
  readonly maximum?: number
  readonly description?: string
}

const BEGIN = '<!-- settings: made by npm run generate -->'
const END = '<!-- end of settings -->'

const rangeOf = ({ enum: values, minimum, maximum, type }: Setting): string => {
  if (values !== undefined) return values.join(', ')
  return minimum === undefined ? (type ?? '') : `${minimum} to ${maximum}`
}

const fallbackOf = ({ default: value }: Setting): string => (value === undefined || value === '' ? '' : `\`${value}\``)

/** The table of everything that can be configured, from the schema that reads it. */
export function settingsTable(): string {
  const settings: readonly [string, Setting][] = Object.entries(ENV_SCHEMA.properties ?? {})
  const rows = settings.map(
    ([name, setting]) =>
      `| \`${name}\` | ${rangeOf(setting)} | ${fallbackOf(setting)} | ${setting.description ?? ''} |`,
  )
  return ['| variable | value | without it | what for |', '| --- | --- | --- | --- |', ...rows].join('\n')
}

/** The README with the table as it is now between its marks. */
export function withSettings(readme: string): string {
  const [before, rest] = readme.split(BEGIN)
  const [, after] = rest?.split(END) ?? []
  if (before === undefined || after === undefined) throw new Error('README.md has lost the marks of its settings.')
  return `${before}${BEGIN}\n${settingsTable()}\n${END}${after}`
}
