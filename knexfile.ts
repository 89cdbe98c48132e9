import { ownerConfig } from './server/setup/owner.ts'

export default ownerConfig(process.env['DATABASE_OWNER_URL'] ?? process.env['DATABASE_URL'] ?? '')
