import { type RequestHandler, Router } from 'express'
import type { Services } from '#server/services.ts'
import { PROBLEMS, type ProblemCode } from './problems.ts'

const isCode = (text: string): text is ProblemCode => Object.hasOwn(PROBLEMS, text)

const escaped = (text: string): string =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;')

/** Names of fields and headers stand between backticks in the table. */
const prose = (text: string): string => escaped(text).replaceAll(/`([^`]+)`/g, '<code>$1</code>')

const page = (title: string, main: string): string => `<!DOCTYPE html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escaped(title)} – Skerry</title>
</head>
<body>
<main>
<h1>${escaped(title)}</h1>
${main}
</main>
</body>
</html>
`

/** The page behind the `type` of a problem: what it means and what to do. */
function problemPage(code: ProblemCode): string {
  const { status, title, help } = PROBLEMS[code]
  return page(title, `<p>${prose(help)}</p>\n<p>HTTP status ${status}. <a href="/problems">All problems</a></p>`)
}

const listPage = (): string =>
  page(
    'Problems',
    `<ul>\n${(Object.keys(PROBLEMS) as ProblemCode[])
      .map(
        (code) =>
          `<li><a href="/problems/${code}">${escaped(PROBLEMS[code].title)}</a> (${PROBLEMS[code].status})</li>`,
      )
      .join('\n')}\n</ul>`,
  )

const HALF_A_YEAR_MS = 182 * 86_400_000

/** RFC 9116: whom to tell of a weakness. It ends within a year, so that nobody trusts a file that was forgotten. */
const securityText = ({ env, clock }: Pick<Services, 'env' | 'clock'>): string =>
  [
    `Contact: ${env.SECURITY_CONTACT}`,
    `Expires: ${new Date(clock().getTime() + HALF_A_YEAR_MS).toISOString()}`,
    'Preferred-Languages: en',
    `Canonical: ${env.BASE_URL}/.well-known/security.txt`,
    '',
  ].join('\n')

/** Pages that need no script and no sign-in. */
export function plainPages(services: Pick<Services, 'env' | 'clock'>): RequestHandler {
  const router = Router()
  router.get('/problems', (_request, response) => {
    response.type('html').send(listPage())
  })
  router.get('/problems/:code', (request, response, next) => {
    const { code } = request.params
    if (isCode(code)) response.type('html').send(problemPage(code))
    else next()
  })
  if (services.env.SECURITY_CONTACT !== '')
    router.get('/.well-known/security.txt', (_request, response) => {
      response.type('text/plain').send(securityText(services))
    })
  return router
}
