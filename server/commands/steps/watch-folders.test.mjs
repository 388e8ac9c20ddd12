import fs from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, expect, test, vi } from 'vitest'
import { watchFolders } from './watch-folders.mjs'

let folder
let stop
let seen
beforeEach(() => {
  folder = fs.mkdtempSync(path.join(os.tmpdir(), 'watch-'))
  fs.mkdirSync(path.join(folder, 'guides'))
  fs.writeFileSync(path.join(folder, 'guides/service.ts'), 'one')
  seen = new Set()
  stop = watchFolders([folder], (file) => seen.add(path.relative(folder, file)))
})
afterEach(() => {
  stop()
  fs.rmSync(folder, { recursive: true })
})

const until = (file) => vi.waitFor(() => expect([...seen]).toContain(file), { timeout: 5_000 })

test('a change in a folder below is seen', async () => {
  fs.writeFileSync(path.join(folder, 'guides/service.ts'), 'two')
  await until('guides/service.ts')
})

test('a file that an editor saves by replacing it is seen every time', async () => {
  for (const content of ['two', 'three']) {
    seen.clear()
    fs.writeFileSync(path.join(folder, 'draft~'), content)
    fs.renameSync(path.join(folder, 'draft~'), path.join(folder, 'guides/service.ts'))
    await until('guides/service.ts')
  }
})

test('a file in a folder that is made later is seen', async () => {
  fs.mkdirSync(path.join(folder, 'effects'))
  await vi.waitFor(
    () => {
      fs.writeFileSync(path.join(folder, 'effects/service.ts'), String(Math.random()))
      expect([...seen]).toContain('effects/service.ts')
    },
    { timeout: 5_000 },
  )
})
