import { spawnSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'

const circuits = fileURLToPath(new URL('../fixtures/circuits/', import.meta.url))

/** Whether the simulator answers on this machine. */
export function hasNgspice(): boolean {
  return spawnSync('ngspice', ['--version']).status === 0
}

/** Rows of numbers of the stored output, frequency first. */
export function storedOutput(name: string): number[][] {
  return rowsOf(readFileSync(join(circuits, `${name}.txt`), 'utf8'))
}

/** Runs the netlist in a folder of its own and gives its rows. @throws Error with the simulator's words when it fails */
export function liveOutput(name: string): number[][] {
  const folder = mkdtempSync(join(tmpdir(), 'setdown-circuit-'))
  try {
    const run = spawnSync('ngspice', ['-b', join(circuits, `${name}.cir`)], { cwd: folder, encoding: 'utf8' })
    if (run.status !== 0) throw new Error(`ngspice failed on ${name}: ${run.stderr}`)
    return rowsOf(readFileSync(join(folder, `${name}.txt`), 'utf8'))
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}

function rowsOf(text: string): number[][] {
  return text
    .trim()
    .split('\n')
    .slice(1)
    .map((line) => line.trim().split(/\s+/).map(Number))
}
