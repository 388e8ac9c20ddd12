import { spawn } from 'node:child_process'
import fs from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import process from 'node:process'
import { afterEach, beforeEach, describe, expect, test } from 'vitest'
import { takeLock, waitForLock } from './lock.mjs'
import { identifyProcess } from './process-identity.mjs'

let folder
let file
beforeEach(() => {
  folder = fs.mkdtempSync(path.join(os.tmpdir(), 'lock-'))
  file = path.join(folder, 'start.lock')
})
afterEach(() => fs.rmSync(folder, { recursive: true }))

const leave = (content) =>
  fs.writeFileSync(file, typeof content === 'string' ? content : JSON.stringify(content))

async function endedProcess() {
  const child = spawn(process.execPath, ['-e', '0'])
  const identity = identifyProcess(child.pid)
  await new Promise((resolve) => child.once('exit', resolve))
  return identity
}

describe('takeLock', () => {
  test('is held for a second taker, who learns who holds it, until it is released', () => {
    const first = takeLock(file, { command: 'npm start' })
    first.note({ address: 'http://127.0.0.1:3000' })
    expect(takeLock(file)).toMatchObject({
      state: 'held',
      holder: { pid: process.pid, command: 'npm start', address: 'http://127.0.0.1:3000' },
    })
    first.release()
    expect(takeLock(file)).toMatchObject({ state: 'taken', previous: null })
  })

  test('takes over from a process that has ended, and says what that one had written', async () => {
    leave({ ...(await endedProcess()), run: 'abc' })
    expect(takeLock(file)).toMatchObject({ state: 'taken', previous: { run: 'abc' } })
  })

  test('takes over when the number now belongs to another process', () => {
    leave({ ...identifyProcess(process.pid), began: '1' })
    expect(takeLock(file).state).toBe('taken')
  })

  test('takes over when the number comes from before the machine was started again', () => {
    leave({ ...identifyProcess(process.pid), boot: 'another' })
    expect(takeLock(file).state).toBe('taken')
  })

  test.each(['', '{"pid":'])('takes over a file with no readable content: %j', (content) => {
    leave(content)
    expect(takeLock(file)).toMatchObject({ state: 'taken', previous: null })
  })

  test('leaves no other file in the folder', () => {
    leave('')
    takeLock(file).note({ address: 'x' })
    expect(fs.readdirSync(folder)).toEqual(['start.lock'])
  })
})

test('waitForLock waits for its turn and tells once that it does', async () => {
  const first = takeLock(file)
  const told = []
  const second = waitForLock(file, {}, (holder) => told.push(holder.pid))
  first.release()
  expect((await second).state).toBe('taken')
  expect(told).toEqual([process.pid])
})
