import type { Command } from 'commander'
import { endWith, print, say } from '#cli/io.ts'

interface Words {
  readonly name: string
  readonly summary: string
  readonly flags: readonly string[]
}

function wordsOf(skerry: Command): readonly Words[] {
  return skerry.commands.map((command) => ({
    name: command.name(),
    summary: command.summary(),
    flags: command.options.flatMap(({ long }) => long ?? []),
  }))
}

const bash = (words: readonly Words[]): string => `# skerry completion for bash: source <(skerry completion bash)
_skerry() {
  local word=\${COMP_WORDS[COMP_CWORD]}
  if [ "$COMP_CWORD" -eq 1 ]; then
    COMPREPLY=($(compgen -W "${words.map(({ name }) => name).join(' ')}" -- "$word"))
    return
  fi
  local flags=""
  case \${COMP_WORDS[1]} in
${words.map(({ name, flags }) => `    ${name}) flags="${flags.join(' ')}" ;;`).join('\n')}
  esac
  case $word in
    -*) COMPREPLY=($(compgen -W "$flags" -- "$word")) ;;
    *) COMPREPLY=($(compgen -f -- "$word")) ;;
  esac
}
complete -o filenames -F _skerry skerry
`

const zsh = (words: readonly Words[]): string => `#compdef skerry
# skerry completion for zsh: put this file on the fpath as _skerry
_skerry() {
  local -a commands
  commands=(
${words.map(({ name, summary }) => `    '${name}:${summary.replaceAll("'", '’').replaceAll(':', '\\:')}'`).join('\n')}
  )
  if (( CURRENT == 2 )); then
    _describe 'command' commands
    return
  fi
  case $words[2] in
${words.map(({ name, flags }) => `    ${name}) _arguments ${flags.map((flag) => `'${flag}'`).join(' ')} '*:file:_files' ;;`).join('\n')}
  esac
}
_skerry "$@"
`

const fish = (
  words: readonly Words[],
): string => `# skerry completion for fish: skerry completion fish > ~/.config/fish/completions/skerry.fish
${words
  .flatMap(({ name, summary, flags }) => [
    `complete -c skerry -n __fish_use_subcommand -a ${name} -d "${summary.replaceAll('"', '')}"`,
    ...flags.map((flag) => `complete -c skerry -n "__fish_seen_subcommand_from ${name}" -l ${flag.slice(2)}`),
  ])
  .join('\n')}
`

const SHELLS: Readonly<Record<string, (words: readonly Words[]) => string>> = { bash, zsh, fish }

/** Prints a script that completes commands and flags, made from the commands themselves. */
export function completion(shell: string, skerry: Command): void {
  const script = Object.hasOwn(SHELLS, shell) ? SHELLS[shell] : undefined
  if (script) return print(script(wordsOf(skerry)))
  say(`There is no completion for ${shell}. Shells: ${Object.keys(SHELLS).join(', ')}.\n`)
  endWith(2)
}
