import { connect, createServer, type AddressInfo, type Socket } from 'node:net'
import type { Page } from '@playwright/test'

/** What the page sends takes its time, so that it can be watched on its way. */
export async function sendSlowly(page: Page, bytesPerSecond: number) {
  const session = await page.context().newCDPSession(page)
  await session.send('Network.enable')
  const emulate = (uploadThroughput: number) =>
    session.send('Network.emulateNetworkConditions', {
      ...{ offline: false, latency: 0, downloadThroughput: -1, uploadThroughput },
    })
  await emulate(bytesPerSecond)
  return { atFullSpeed: () => emulate(-1) }
}

/** A line to the server that can be cut in the middle of anything, and mended. */
export async function layLine(serverUrl: string) {
  const target = new URL(serverUrl)
  const sockets = new Set<Socket>()
  let isCut = false
  const server = createServer((near) => {
    if (isCut) return near.destroy()
    const far = connect(Number(target.port), target.hostname)
    for (const [socket, other] of [
      [near, far],
      [far, near],
    ] as const) {
      sockets.add(socket)
      socket.on('error', () => other.destroy())
      socket.on('close', () => {
        sockets.delete(socket)
        other.destroy()
      })
      socket.pipe(other)
    }
    return near
  })
  await new Promise<void>((done) => server.listen(0, target.hostname, done))
  const cut = () => {
    isCut = true
    for (const socket of sockets) socket.destroy()
  }
  return {
    url: `http://${target.hostname}:${(server.address() as AddressInfo).port}`,
    cut,
    mend: () => (isCut = false),
    takeUp: () => {
      cut()
      server.close()
    },
  }
}
