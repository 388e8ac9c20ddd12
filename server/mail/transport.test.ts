import { once } from 'node:events'
import { createServer, type AddressInfo, type Socket } from 'node:net'
import { expect, it } from 'vitest'
import { createTransport } from './transport.ts'

it('hangs up on a server that talks for ever', async () => {
  // A greeting without an end: no step is ever silent, and none is ever done.
  const server = createServer((socket) => {
    const talking = setInterval(() => socket.write('220-still here\r\n'), 10)
    socket.on('error', () => {})
    socket.on('close', () => clearInterval(talking))
  })
  server.listen(0, '127.0.0.1')
  await once(server, 'listening')
  const connected = once(server, 'connection') as Promise<[Socket]>
  const transport = createTransport(
    { mailFrom: 'book@marsh.example' },
    `smtp://127.0.0.1:${(server.address() as AddressInfo).port}`,
    300,
  )
  const sending = transport.send({ id: '1', recipient: 'reader@marsh.example', subject: 'Hello', body: 'Text', messageId: 'one' })
  const [socket] = await connected
  const hungUp = once(socket, 'close')
  await expect(sending).rejects.toThrow()
  await hungUp
  transport.close()
  server.close()
})
