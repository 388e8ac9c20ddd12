export { pageNumber }

import { z } from 'zod'

const whole = { error: 'Page: a whole number from 1.' }

/** The page of a long list, from a query. */
const pageNumber = z.coerce.number(whole).int(whole).min(1, whole).max(100_000, { error: 'There are not that many pages.' })
