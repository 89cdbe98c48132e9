import { createServer } from 'node:http'
import { createApp } from './app.ts'
import { readEnv } from './env.ts'
import { openServices } from './make-services.ts'
import { stopOnSignal } from './stop.ts'

const read = readEnv(process.env)
if (!read.ok) {
  process.stderr.write(
    `The server does not start with this configuration:\n${read.problems.map((line) => `  ${line}\n`).join('')}`,
  )
  process.exit(2)
}
const { env } = read
const { services, boss, close } = openServices(env, { name: 'skerry web', supervise: false, clock: () => new Date() })
await boss.start()

const server = createServer(
  { requestTimeout: 60_000, headersTimeout: 15_000, keepAliveTimeout: 10_000 },
  createApp(services),
)
server.on('error', (error) => {
  services.log.fatal({ event: 'listen', err: error }, 'cannot listen')
  process.exit(1)
})
server.listen(env.PORT, env.HOST, () => {
  const address = server.address()
  const port = typeof address === 'object' && address !== null ? address.port : env.PORT
  services.log.info({ event: 'listening', host: env.HOST, port }, 'listening')
})

stopOnSignal(services.log, async () => {
  const closed = new Promise((resolve) => server.close(resolve))
  server.closeIdleConnections()
  const late = setTimeout(() => server.closeAllConnections(), 25_000)
  await closed
  clearTimeout(late)
  await close()
})
