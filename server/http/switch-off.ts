import { randomUUID } from 'node:crypto'
import { type Request, type RequestHandler, type Response, Router } from 'express'
import { escapeHtml } from '#server/commands/mail-text.ts'
import { inOrganisation } from '#server/db.ts'
import { switchKey } from '#server/mail/switch-key.ts'
import { readUnsubscribeToken, type Unsubscription } from '#server/mail/unsubscribe.ts'
import { writeAudit } from '#server/queries/audit.ts'
import { switchMail } from '#server/queries/mail-switches.ts'
import type { Services } from '#server/services.ts'
import { sendFailure } from './answer.ts'
import { addressOf } from './limits.ts'

const page = (title: string, body: string): string =>
  `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>${title}</title></head><body><main><h1>${title}</h1>${body}</main></body></html>`

const GONE = page(
  'This link is not known',
  '<p>It may have been cut off. Mails can be switched off in your account, too.</p>',
)

async function switchOff(
  { db, clock }: Services,
  { organisation, person, kind }: Unsubscription,
  request: Request,
): Promise<void> {
  await inOrganisation(db, organisation, async (tx) => {
    if (!(await switchMail(tx, { organisation, person }, kind, false))) return
    await writeAudit(tx, {
      organisation,
      person,
      roles: [],
      action: 'switch-mail',
      subject: `person/${person}`,
      at: clock(),
      request: randomUUID(),
      address: addressOf(request),
      details: { kind, on: false, by: 'link' },
    })
  })
}

/**
 * The link in the head of a mail (RFC 8058). Only POST switches off: programs that look at links in mails use GET, which
 * shows a button. The token is signed for one person and one kind, so it needs no session and no other token.
 */
export function switchOffPages(services: Services): RequestHandler {
  const router = Router()
  const key = switchKey(services.env)
  const path = '/mails/switch-off/:token'
  const told = (response: Response, status: number, html: string): void => {
    response.status(status).set('cache-control', 'no-store').type('html').send(html)
  }
  router.get(path, (request, response) => {
    const wish = readUnsubscribeToken(request.params['token'] ?? '', key)
    if (wish === undefined) return told(response, 404, GONE)
    told(
      response,
      200,
      page(
        'Switch mails off',
        `<form method="post"><button>No more mails of the kind “${escapeHtml(wish.kind)}”</button></form>`,
      ),
    )
  })
  router.post(path, async (request, response) => {
    try {
      const wish = readUnsubscribeToken(request.params['token'] ?? '', key)
      if (wish === undefined) return told(response, 404, GONE)
      await switchOff(services, wish, request)
      told(
        response,
        200,
        page(
          'Switched off',
          `<p>You get no more mails of the kind “${escapeHtml(wish.kind)}”. They can be switched on again in your account.</p>`,
        ),
      )
    } catch (error) {
      sendFailure(response, error, response.locals['request'] ?? '', services.log)
    }
  })
  return router
}
