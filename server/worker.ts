import { readEnv } from './env.ts'
import { handlers, work } from './jobs/work.ts'
import { openServices } from './make-services.ts'
import { stopOnSignal } from './stop.ts'

const read = readEnv(process.env)
if (!read.ok) {
  process.stderr.write(
    `The worker does not start with this configuration:\n${read.problems.map((line) => `  ${line}\n`).join('')}`,
  )
  process.exit(2)
}
const { services, boss, close } = openServices(read.env, {
  name: 'skerry worker',
  supervise: true,
  clock: () => new Date(),
})
await boss.start()
await work(services, boss, handlers())
services.log.info({ event: 'working' }, 'working')
stopOnSignal(services.log, close)
