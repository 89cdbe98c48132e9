import type { Command } from 'commander'
import { bash } from '#cli/completion/bash.ts'
import { fish } from '#cli/completion/fish.ts'
import { type CommandWords, SHELL_NAMES, wordsOf } from '#cli/completion/words.ts'
import { zsh } from '#cli/completion/zsh.ts'
import { endWith, print, say } from '#cli/io.ts'

const SCRIPTS = { bash, zsh, fish } as const satisfies Record<
  (typeof SHELL_NAMES)[number],
  (words: readonly CommandWords[]) => string
>

/** Prints a script that completes commands, flags and what they take, made from the commands themselves. */
export function completion(shell: string, skerry: Command): void {
  const known = SHELL_NAMES.find((name) => name === shell)
  if (known) return print(SCRIPTS[known](wordsOf(skerry)))
  say(`There is no completion for ${shell}. Shells: ${SHELL_NAMES.join(', ')}.\n`)
  endWith(2)
}
