import { createServer } from 'node:net'
import { start, Trouble } from './run.mjs'

const PATIENCE_MS = 60_000
const PAUSE_MS = 250

/** Throws where another program listens on the port. */
export function checkPort(port) {
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new Trouble('PORT must be a whole number from 1 to 65535.')
  }
  return new Promise((resolve, reject) => {
    const probe = createServer()
    probe.once('error', () =>
      reject(new Trouble(`Port ${port} is taken by another program. Choose another: PORT=${port + 1} npm run up`)),
    )
    probe.listen(port, () => probe.close(resolve))
  })
}

/** Starts the built product; it stops when this process is told to. */
export function serve(port, env = {}) {
  const child = start(process.execPath, ['node_modules/next/dist/bin/next', 'start', '-p', String(port)], env)
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => child.kill(signal))
  return child
}

/** Waits until the product says that it is well. Gives up at once where it says that its settings are wrong. */
export async function waitUntilWell(port, child) {
  let ended = false
  child.once('exit', () => (ended = true))
  const giveUpAt = Date.now() + PATIENCE_MS
  while (Date.now() < giveUpAt) {
    if (ended) throw new Trouble('The product stopped while it was starting. What it said stands above.')
    const answer = await fetch(`http://127.0.0.1:${port}/api/health`).catch(() => undefined)
    if (answer?.ok) return
    if (answer?.status === 500) {
      const { sentences = [] } = await answer.json().catch(() => ({}))
      throw new Trouble(['The product started and is not well.', ...sentences].join('\n'))
    }
    await new Promise((resume) => setTimeout(resume, PAUSE_MS))
  }
  throw new Trouble(`The product did not answer within ${PATIENCE_MS / 1000} seconds.`)
}
