import { spawn } from 'node:child_process'
import { fileURLToPath } from 'node:url'

/** The project's folder, whatever folder a command was given in. */
export const root = fileURLToPath(new URL('../..', import.meta.url))

/** Trouble with a sentence of its own; anything else is a mistake in these scripts. */
export class Trouble extends Error {}

/** Environment of every command started here: tools are told to send nothing anywhere. */
const quiet = { NEXT_TELEMETRY_DISABLED: '1', DRIZZLE_DISABLE_TELEMETRY: '1' }

/**
 * Starts a command in the project's folder, its output going to ours.
 * @param {string} command
 * @param {string[]} args
 * @param {Record<string, string>} [env] added to this process's own
 */
export function start(command, args, env = {}) {
  return spawn(command, args, { cwd: root, stdio: 'inherit', env: { ...process.env, ...quiet, ...env } })
}

/** Runs a command to its end; throws Trouble when it fails. */
export function run(command, args, env = {}) {
  return new Promise((resolve, reject) => {
    const child = start(command, args, env)
    child.on('error', () => reject(new Trouble(`${command} could not be started. Is it installed?`)))
    child.on('exit', (code) =>
      code === 0 ? resolve(undefined) : reject(new Trouble(`"${command} ${args.join(' ')}" failed.`)),
    )
  })
}

/** Runs a TypeScript script of this project as server code. */
export function runScript(file, env = {}) {
  return run(process.execPath, ['--conditions=react-server', '--import', 'tsx', file], env)
}

/** Runs a tool that the project installs, by the path inside its package. */
export function runTool(path, args, env = {}) {
  return run(process.execPath, [`node_modules/${path}`, ...args], env)
}

/** Runs `work`; a Trouble is told as its sentence, without a stack. */
export async function tellTrouble(work) {
  try {
    await work()
  } catch (trouble) {
    if (!(trouble instanceof Trouble)) throw trouble
    console.error(`\n${trouble.message}`)
    process.exit(1)
  }
}
