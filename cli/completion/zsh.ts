import type { CommandWords, FlagWords, Takes } from './words.ts'

const quoted = (text: string): string => `'${text.replaceAll("'", "'\\''")}'`
/** Signs by which zsh divides a description from what it describes. */
const plain = (text: string): string => text.replaceAll(/[:[\]\\]/g, '\\$&')

function action(takes: Takes): string {
  if (takes === 'file') return 'file:_files'
  if (takes === 'folder') return 'folder:_files -/'
  return takes === 'text' ? 'text: ' : `word:(${takes.join(' ')})`
}

function flag({ names, about, takes }: FlagWords): string {
  const value = takes === undefined ? '' : `:${action(takes)}`
  const told = quoted(`[${plain(about)}]${value}`)
  // A flag that takes a value may come again, as formats with their files do.
  const [only = '', ...others] = names
  return others.length === 0 ? `'*'${only}${told}` : `'*'{${names.join(',')}}${told}`
}

function command({ name, flags, given }: CommandWords): string {
  const rest = quoted(`*:${action(given)}`)
  return `    ${name}) _arguments ${[...flags.map(flag), rest].join(' ')} ;;`
}

/** A script for zsh. */
export const zsh = (words: readonly CommandWords[]): string => `#compdef skerry
# skerry completion for zsh: put this file on the fpath as _skerry
_skerry() {
  local -a commands
  commands=(
${words.map(({ name, about }) => `    ${quoted(`${name}:${plain(about)}`)}`).join('\n')}
  )
  if (( CURRENT == 2 )); then
    _describe 'command' commands
    return
  fi
  shift words
  (( CURRENT-- ))
  case $words[1] in
${words.map(command).join('\n')}
  esac
}
# Sourced, it registers itself; found on the fpath, it is called.
if [[ $funcstack[1] == _skerry ]]; then
  _skerry "$@"
else
  compdef _skerry skerry
fi
`
