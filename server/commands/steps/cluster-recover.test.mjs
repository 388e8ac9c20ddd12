import { spawn } from 'node:child_process'
import fs from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import process from 'node:process'
import { afterEach, beforeEach, expect, test } from 'vitest'
import { clearAfterCrash } from './cluster-recover.mjs'

let data
beforeEach(() => (data = fs.mkdtempSync(path.join(os.tmpdir(), 'data-'))))
afterEach(() => fs.rmSync(data, { recursive: true, force: true }))

const pidFile = () => path.join(data, 'postmaster.pid')

test('nothing to clear in a folder that was left in order, or is not there', async () => {
  expect(await clearAfterCrash(data)).toBe(false)
  expect(await clearAfterCrash(path.join(data, 'nowhere'))).toBe(false)
})

test('a postmaster.pid whose number now belongs to a stranger is removed and the stranger left alone', async () => {
  fs.writeFileSync(pidFile(), `${process.pid}\n${data}\n`)
  expect(await clearAfterCrash(data)).toBe(true)
  expect(fs.existsSync(pidFile())).toBe(false)
})

test('a process that still works on the folder is ended first', async () => {
  // A copy of Node.js under PostgreSQL's name: what counts is the program and the folder it works in.
  const program = path.join(data, 'postgres')
  fs.copyFileSync(process.execPath, program)
  const old = spawn(program, ['-e', 'setInterval(() => {}, 1000); console.log("up")'], { cwd: data })
  const ended = new Promise((resolve) => old.once('exit', (code, signal) => resolve(signal)))
  await new Promise((resolve) => old.stdout.once('data', resolve))
  fs.writeFileSync(pidFile(), `${old.pid}\n${data}\n`)
  expect(await clearAfterCrash(data)).toBe(true)
  expect(await ended).toBe('SIGINT')
  expect(fs.existsSync(pidFile())).toBe(false)
})

test('a person who only looks into the folder is left alone', async () => {
  const shell = spawn('cat', { cwd: data })
  await new Promise((resolve) => shell.once('spawn', resolve))
  fs.writeFileSync(pidFile(), '1\n')
  await clearAfterCrash(data)
  expect([shell.exitCode, shell.signalCode]).toEqual([null, null])
  shell.stdin.end()
  expect(await new Promise((resolve) => shell.once('exit', resolve))).toBe(0)
})
