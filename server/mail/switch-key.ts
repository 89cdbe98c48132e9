import { createHmac } from 'node:crypto'
import type { Env } from '#server/env.ts'

/** The key of the links that switch mails off, made from the secret that all processes share. */
export const switchKey = ({ SESSION_SECRET }: Pick<Env, 'SESSION_SECRET'>): Uint8Array =>
  createHmac('sha256', SESSION_SECRET).update('switches of mails').digest()
