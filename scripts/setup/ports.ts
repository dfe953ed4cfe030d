import { createServer } from 'node:net'

/** Whether nothing listens on a port of one address. An address this machine does not have counts as free. */
export function isFree(host: string, port: number): Promise<boolean> {
  return new Promise((resolve) => {
    const probe = createServer()
    probe.once('error', (error: NodeJS.ErrnoException) =>
      resolve(error.code === 'EADDRNOTAVAIL' || error.code === 'EAFNOSUPPORT'),
    )
    probe.listen({ host, port, exclusive: true }, () => probe.close(() => resolve(true)))
  })
}

/**
 * Whether `http://localhost:port` would reach us and nobody else. A browser tries ::1 first, so a stranger who
 * listens there alone would take our place.
 */
export async function isFreeForBrowsers(host: string, port: number): Promise<boolean> {
  return (await isFree(host, port)) && (!isLoopback(host) || (await isFree('::1', port)))
}

/** The first port from `from` upwards that is free, or undefined when a hundred are taken. */
export async function nextFree(host: string, from: number): Promise<number | undefined> {
  for (let port = from; port < from + 100 && port <= 65_535; port++)
    if (await isFreeForBrowsers(host, port)) return port
  return undefined
}

/** A port of 127.0.0.1 that the system chooses. */
export function anyFreePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer()
    probe.once('error', reject)
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address()
      probe.close(() => (typeof address === 'object' && address ? resolve(address.port) : reject(new Error('no port'))))
    })
  })
}

export function isLoopback(host: string): boolean {
  return host === 'localhost' || host === '::1' || /^127\.\d+\.\d+\.\d+$/.test(host)
}
