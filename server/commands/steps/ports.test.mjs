import net from 'node:net'
import { expect, test } from 'vitest'
import { choosePort } from './choose-port.mjs'
import { freePortFrom, isPortFree, randomFreePort, readPort } from './ports.mjs'

const listening = (host) =>
  new Promise((resolve) => {
    const server = net.createServer().listen(0, host, () => resolve(server))
  })

test.each(['127.0.0.1', '0.0.0.0', undefined])(
  'a port with a program on %s is not free, and free after it',
  async (host) => {
    const server = await listening(host)
    const { port } = server.address()
    expect(await isPortFree(port)).toBe(false)
    await new Promise((resolve) => server.close(resolve))
    expect(await isPortFree(port)).toBe(true)
  },
)

test('freePortFrom goes up to the first free port', async () => {
  expect(await freePortFrom(3000, async (port) => port === 3003)).toBe(3003)
  await expect(freePortFrom(65_534, async () => false)).rejects.toThrow('No port from 65534 up is free')
})

test('randomFreePort stays in its range and gives up in words', async () => {
  const port = await randomFreePort(async () => true)
  expect(port).toBeGreaterThanOrEqual(54_000)
  expect(port).toBeLessThan(55_000)
  await expect(randomFreePort(async () => false)).rejects.toThrow('No port between 54000 and 54999')
})

test('readPort takes a number and nothing else', () => {
  expect(readPort('8080')).toBe(8080)
  expect(readPort('')).toBeUndefined()
  expect(readPort(undefined)).toBeUndefined()
  for (const wrong of ['abc', '0', '65536', '80.5', '-1', '3000x', '1e3'])
    expect(() => readPort(wrong)).toThrow('no port')
})

test('choosePort moves on from 3000 by itself, but never from a port that was asked for', async () => {
  const isFree = async (port) => port !== 3000
  expect(await choosePort(undefined, isFree)).toBe(3001)
  expect(await choosePort('4000', isFree)).toBe(4000)
  await expect(choosePort('3000', isFree)).rejects.toThrow('Port 3000 is in use by another program')
})
