export { data }
export type { Data }

import { readyPassphrase } from '#server/people/passphrase.ts'

type Data = ReturnType<typeof data>

function data() {
  return { passphrase: readyPassphrase() }
}
