import type { CommandWords, Takes } from './words.ts'

/** The command by which bash finds what fits the word that is being typed. */
function matching(takes: Takes): string {
  if (takes === 'file') return 'compgen -f'
  if (takes === 'folder') return 'compgen -d'
  return takes === 'text' ? ':' : `compgen -W "${takes.join(' ')}"`
}

function afterFlags({ name, flags }: CommandWords): string[] {
  return flags.flatMap(({ names, takes }) =>
    takes === undefined
      ? []
      : [`    ${names.map((flag) => `"${name} ${flag}"`).join(' | ')}) from='${matching(takes)}' ;;`],
  )
}

function afterCommand({ name, flags, given }: CommandWords): string {
  const long = flags.flatMap(({ names }) => names.filter((flag) => flag.startsWith('--')))
  return `      ${name}) from='${matching(given)}'; flags="${long.join(' ')}" ;;`
}

/** A script for bash. */
export const bash = (
  words: readonly CommandWords[],
): string => `# skerry completion for bash: source <(skerry completion bash)
_skerry() {
  local word=\${COMP_WORDS[COMP_CWORD]} before=\${COMP_WORDS[COMP_CWORD-1]} command=\${COMP_WORDS[1]} flags="" from=:
  case "$command $before" in
${words.flatMap(afterFlags).join('\n')}
    *) case $command in
${words.map(afterCommand).join('\n')}
    esac ;;
  esac
  if [ "$COMP_CWORD" -eq 1 ]; then from='compgen -W "${words.map(({ name }) => name).join(' ')}"'; fi
  if [[ $word == -* && -n $flags ]]; then from="compgen -W '$flags'"; fi
  local found=$(eval "$from -- \\"\\$word\\"") IFS=$'\\n'
  COMPREPLY=($found)
}
complete -o filenames -F _skerry skerry
`
