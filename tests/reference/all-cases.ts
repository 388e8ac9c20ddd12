export { loadReferenceCases }

import { readdir } from 'node:fs/promises'
import { fileURLToPath } from 'node:url'
import type { ReferenceCase } from './reference-case.ts'

/** The cases of every calculator: one file named after its slug, exporting `cases`, beside this one. */
async function loadReferenceCases(slugs: Iterable<string>): Promise<ReferenceCase[]> {
  const files = new Set(await readdir(fileURLToPath(new URL('.', import.meta.url))))
  const cases: ReferenceCase[] = []
  for (const slug of slugs) {
    if (!files.has(`${slug}.ts`)) continue
    const module: { cases: readonly ReferenceCase[] } = await import(
      new URL(`./${slug}.ts`, import.meta.url).href
    )
    cases.push(...module.cases)
  }
  return cases
}
