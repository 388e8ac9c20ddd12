export { readVersion }

import { readFileSync } from 'node:fs'

/** The product's version, as package.json says it. */
function readVersion(): string {
  const text = readFileSync(new URL('../package.json', import.meta.url), 'utf8')
  return (JSON.parse(text) as { version: string }).version
}
