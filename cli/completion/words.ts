import type { Command, Option } from 'commander'
import { FORMAT_NAMES } from '#cli/formats/formats.ts'
import { rulePages } from '#core/judge/pages.ts'
import { SHIPPED_BOOKS } from '#core/judge/shipped.ts'

/** What may stand at a place: files, folders, one of some words, or whatever the person likes. */
export type Takes = 'file' | 'folder' | 'text' | readonly string[]

export interface FlagWords {
  /** As typed: `-f` and `--format`, or the long form alone. */
  readonly names: readonly string[]
  readonly about: string
  /** What follows the flag; nothing for a switch. */
  readonly takes: Takes | undefined
}

export interface CommandWords {
  readonly name: string
  readonly about: string
  readonly flags: readonly FlagWords[]
  /** What the command is given. */
  readonly given: Takes
}

/** The shells that there is a script for. */
export const SHELL_NAMES = ['bash', 'zsh', 'fish'] as const

const ruleNames = (): readonly string[] => [...new Set(rulePages().map(({ record }) => record.id))].toSorted()

/** What stands for a value in the help tells what may be typed for it. */
function meant(placeholder: string): Takes {
  if (placeholder === 'folder') return 'folder'
  if (placeholder === 'id') return SHIPPED_BOOKS
  if (placeholder === 'shell') return SHELL_NAMES
  if (placeholder === 'rule') return ruleNames()
  return ['file', 'paths', 'before', 'after', 'readings'].includes(placeholder) ? 'file' : 'text'
}

function flagWords({ short, long, flags, description, argChoices }: Option): FlagWords {
  const [, placeholder] = /[<[]([a-z]+)[>\]]/.exec(flags) ?? []
  const choices = argChoices ?? (long === '--format' ? FORMAT_NAMES : undefined)
  return {
    names: [short, long].filter((name) => name !== undefined),
    about: description,
    takes: placeholder === undefined ? undefined : (choices ?? meant(placeholder)),
  }
}

/** What can be typed, from the commands themselves. */
export function wordsOf(skerry: Command): readonly CommandWords[] {
  return skerry.commands.map((command) => ({
    name: command.name(),
    about: command.summary(),
    flags: command.options.map(flagWords),
    given: givenTo(command, skerry),
  }))
}

function givenTo(command: Command, skerry: Command): Takes {
  const [first] = command.registeredArguments.map((argument) => argument.name())
  if (first === 'command') return skerry.commands.map((other) => other.name())
  return first === undefined ? 'text' : meant(first)
}
