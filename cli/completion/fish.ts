import type { CommandWords, FlagWords, Takes } from './words.ts'

const quoted = (text: string): string => `'${text.replaceAll(/['\\]/g, '\\$&')}'`

function values(takes: Takes): string {
  if (takes === 'file') return '-r -F'
  if (takes === 'folder') return "-x -a '(__fish_complete_directories)'"
  return takes === 'text' ? '-x' : `-x -a ${quoted(takes.join(' '))}`
}

function flag({ names, about, takes }: FlagWords): string {
  const typed = names.map((name) => (name.startsWith('--') ? `-l ${name.slice(2)}` : `-s ${name.slice(1)}`))
  return [...typed, ...(takes === undefined ? [] : [values(takes)]), `-d ${quoted(about)}`].join(' ')
}

function lines({ name, about, flags, given }: CommandWords): string[] {
  const within = `complete -c skerry -n '__fish_seen_subcommand_from ${name}'`
  return [
    `complete -c skerry -f -n __fish_use_subcommand -a ${name} -d ${quoted(about)}`,
    ...(given === 'file' ? [] : [`${within} -f`]),
    ...(typeof given === 'string' ? [] : [`${within} -a ${quoted(given.join(' '))}`]),
    ...flags.map((each) => `${within} ${flag(each)}`),
  ]
}

/** A script for fish. */
export const fish = (
  words: readonly CommandWords[],
): string => `# skerry completion for fish: skerry completion fish > ~/.config/fish/completions/skerry.fish
${words.flatMap(lines).join('\n')}
`
