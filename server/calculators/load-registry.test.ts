import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { loadCalculators } from './load-registry.ts'

let home: string
beforeEach(async () => {
  home = await mkdtemp(join(tmpdir(), 'calculators-'))
})
afterEach(() => rm(home, { recursive: true }))

async function addFolder(name: string, index: string) {
  await mkdir(join(home, name))
  await writeFile(join(home, name, 'index.ts'), index)
}

describe('loadCalculators', () => {
  it('finds every folder with a calculator, by title, and passes over the others', async () => {
    await addFolder('droop', "export const calculator = { slug: 'droop', title: 'Droop' }")
    await addFolder('ackermann', "export const calculator = { slug: 'ackermann', title: 'Steering' }")
    await mkdir(join(home, 'common'))
    expect([...(await loadCalculators(home)).keys()]).toEqual(['droop', 'ackermann'])
  })

  it('will not start with a calculator that is not called what its folder is called', async () => {
    await addFolder('toe', "export const calculator = { slug: 'toe-in', title: 'Toe' }")
    await expect(loadCalculators(home)).rejects.toThrow(
      'shared/calculators/toe/index.ts must export a calculator with the slug “toe”.',
    )
  })

  it('finds the calculators of the product', async () => {
    expect([...(await loadCalculators()).keys()]).toEqual(
      expect.arrayContaining(['fluid-blend', 'fluid-temperature']),
    )
  })
})
