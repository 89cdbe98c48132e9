import type { Role } from './roles.ts'

/**
 * Everything that a person can do, and the roles that may. Conditions beyond the role (who uploaded, which state) are in
 * `can.ts`; an action that is not listed does not exist, and a role that is not named may not.
 */
export const ACTIONS = {
  'report.list': ['installer', 'reviewer', 'auditor', 'administrator'],
  'report.read': ['installer', 'reviewer', 'auditor', 'administrator'],
  'report.create': ['installer', 'reviewer'],
  'report.revise': ['installer', 'reviewer'],
  'report.attach': ['installer', 'reviewer'],
  'report.assign': ['installer', 'reviewer', 'administrator'],
  'report.submit': ['installer', 'reviewer'],
  'report.recall': ['installer', 'reviewer'],
  'report.discard': ['installer', 'reviewer'],
  'report.annotate': ['reviewer'],
  'report.answer': ['installer', 'reviewer'],
  'report.accept': ['reviewer'],
  'report.return': ['reviewer'],
  'report.approve': ['reviewer'],
  'report.issue': ['reviewer'],
  'report.correct': ['installer', 'reviewer'],
  'report.withdraw': ['reviewer', 'administrator'],
  'register.read': ['installer', 'reviewer', 'auditor', 'administrator'],
  'register.download': ['installer', 'reviewer', 'auditor', 'administrator'],
  'register.sample': ['auditor', 'administrator'],
  'instrument.read': ['installer', 'reviewer', 'auditor', 'administrator'],
  'instrument.write': ['administrator'],
  'condition.read': ['installer', 'reviewer', 'auditor', 'administrator'],
  'condition.write': ['administrator'],
  'person.list': ['installer', 'reviewer', 'administrator'],
  'person.manage': ['administrator'],
  'organisation.read': ['installer', 'reviewer', 'auditor', 'administrator'],
  'organisation.manage': ['administrator'],
  'organisation.export': ['administrator'],
  'audit.read': ['auditor', 'administrator'],
  'job.manage': ['administrator'],
  'mail.read': ['administrator'],
  'self.manage': ['installer', 'reviewer', 'auditor', 'administrator'],
} as const satisfies Readonly<Record<string, readonly Role[]>>

export type Action = keyof typeof ACTIONS
