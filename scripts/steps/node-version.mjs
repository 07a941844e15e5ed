import { Trouble } from './run.mjs'

const LEAST = [20, 11]

/** Throws where Node is too old, before anything is installed with it. */
export function checkNode(version = process.versions.node) {
  const [major, minor] = version.split('.').map(Number)
  if (major < LEAST[0] || (major === LEAST[0] && minor < LEAST[1])) {
    throw new Trouble(`This needs Node ${LEAST.join('.')} or newer, and ${version} is running it.`)
  }
}
