export { loadCalculators }
export type { CalculatorRegistry }

import { existsSync } from 'node:fs'
import { readdir } from 'node:fs/promises'
import { fileURLToPath, pathToFileURL } from 'node:url'
import { join } from 'node:path'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'

/** Every calculator by its slug, in the order of their titles. */
type CalculatorRegistry = ReadonlyMap<string, CalculatorDefinition>

const home = fileURLToPath(new URL('../../shared/calculators/', import.meta.url))

/**
 * Reads every folder of `shared/calculators` that has an index.ts; a new calculator is a new folder and
 * nothing else. Throws when a folder has no `calculator` or its slug is not the folder's name: better no
 * start than a missing page.
 */
async function loadCalculators(directory = home): Promise<CalculatorRegistry> {
  const entries = await readdir(directory, { withFileTypes: true })
  const folders = entries.filter(
    (entry) => entry.isDirectory() && existsSync(join(directory, entry.name, 'index.ts')),
  )
  const found = await Promise.all(folders.map((folder) => loadOne(directory, folder.name)))
  return new Map(
    found
      .sort((a, b) => a.title.localeCompare(b.title, 'en'))
      .map((calculator) => [calculator.slug, calculator]),
  )
}

async function loadOne(directory: string, folder: string): Promise<CalculatorDefinition> {
  const module: { calculator?: CalculatorDefinition } = await import(
    pathToFileURL(join(directory, folder, 'index.ts')).href
  )
  if (module.calculator?.slug !== folder) {
    throw new Error(
      `shared/calculators/${folder}/index.ts must export a calculator with the slug “${folder}”.`,
    )
  }
  return module.calculator
}
