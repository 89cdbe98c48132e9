import type { Route } from '#server/http/route.ts'
import { REPORT_ROUTES } from './reports.ts'
import { SESSION_ROUTES } from './session.ts'

/** Every route of the API. What is not here does not exist; the OpenAPI document and the access matrix are made from it. */
export const ROUTES: readonly Route[] = [...SESSION_ROUTES, ...REPORT_ROUTES]
