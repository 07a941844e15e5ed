import type { BoardEntry, ControlEntry, GroupEntry } from './schema-preamp'

/** What no single field can tell: data that fit a form and still describe a preamp that cannot be. */

export interface Problem {
  path: (string | number)[]
  message: string
}

/** A printed limit is rounded, and gain has a tolerance: 0.25 dB over both. */
const ROUNDING = 10 ** (0.25 / 20)

const repeated = (ids: string[]) => ids.find((id, i) => ids.indexOf(id) !== i)

function memberCount(control: ControlEntry): number | null {
  if (control.kind === 'bank') return control.switchCount
  return control.kind === 'buttons' ? control.buttons.length : null
}

function choiceKeys(control: ControlEntry, members: number[] | null): string[] {
  if (control.kind === 'slide' || control.kind === 'plugs') return control.positions.map(({ id }) => id)
  if (control.kind === 'buttons' && control.latch === 'one-in') return control.buttons.map(({ id }) => id)
  const width = members?.length ?? memberCount(control) ?? 0
  return Array.from({ length: 2 ** width }, (_, bits) => (width === 0 ? '' : bits.toString(2).padStart(width, '0')))
}

function membersOf(group: GroupEntry, control: ControlEntry): number[] {
  return group.members ?? Array.from({ length: memberCount(control) ?? 0 }, (_, i) => i + 1)
}

function findGroupProblems(group: GroupEntry, board: BoardEntry): string[] {
  const control = board.controls.find(({ id }) => id === group.control)
  if (!control) return [`There is no control "${group.control}".`]
  const count = memberCount(control)
  const found: string[] = []
  if (count === null && group.members) found.push(`"${control.label}" has no numbered members.`)
  for (const member of group.members ?? []) {
    if (count !== null && member > count) found.push(`"${control.label}" has no member ${member}.`)
  }
  if (group.how === 'choice') {
    const keys = choiceKeys(control, group.members)
    for (const key of Object.keys(group.options)) if (!keys.includes(key)) found.push(`"${control.label}" cannot stand at "${key}".`)
    for (const key of keys) if (!(key in group.options)) found.push(`Nothing is said for "${control.label}" at "${key}".`)
  }
  const parts = group.how === 'parallel' ? group.resistorsOhms : group.how === 'sum' ? group.capacitorsPicofarads : null
  if (parts && parts.length !== membersOf(group, control).length) found.push('Give one value for each member.')
  if (group.how === 'on-off' && membersOf(group, control).length !== 1) found.push('On or off takes one member.')
  if (group.sets === 'gain') {
    for (const { gainId } of Object.values(group.options)) {
      if (!board.gains.some(({ id }) => id === gainId)) found.push(`There is no gain "${gainId}".`)
    }
  }
  if (group.sets === 'input') {
    for (const { pathId } of Object.values(group.options)) {
      if (!board.paths.some(({ id }) => id === pathId)) found.push(`There is no input "${pathId}".`)
    }
  }
  const { onlyWhen } = group
  if (onlyWhen) {
    const other = board.groups.find(({ id }) => id === onlyWhen.group)
    if (!other || other.how !== 'choice') found.push(`There is no choice "${onlyWhen.group}".`)
    else for (const key of onlyWhen.options) if (!(key in other.options)) found.push(`"${other.label}" has no "${key}".`)
  }
  return found
}

function findStateProblems(board: BoardEntry): Problem[] {
  const found: Problem[] = []
  for (const control of board.controls) {
    const state = board.asDelivered[control.id]
    if (state === undefined) {
      found.push({ path: ['asDelivered'], message: `How "${control.label}" is delivered is not said.` })
    } else if (!choiceKeys(control, null).includes(state)) {
      found.push({ path: ['asDelivered', control.id], message: `"${control.label}" cannot stand at "${state}".` })
    }
  }
  board.exclusions.forEach(({ control: id, members }, i) => {
    const control = board.controls.find((each) => each.id === id)
    const count = control ? memberCount(control) : null
    if (!control || count === null) found.push({ path: ['exclusions', i], message: `"${id}" has no numbered members.` })
    else if (members.some((member) => member > count)) {
      found.push({ path: ['exclusions', i], message: `"${control.label}" has ${count} members only.` })
    } else if (members[0] === members[1]) {
      found.push({ path: ['exclusions', i], message: 'A switch cannot exclude itself.' })
    } else if (members.every((member) => board.asDelivered[id]?.[member - 1] === '1')) {
      found.push({ path: ['asDelivered', id], message: `${members.join(' and ')} cannot both be ON.` })
    }
  })
  return found
}

/**
 * The output has one limit. Behind feedback equalisation every gain reaches exactly that; with other topologies an
 * earlier stage may run out before it, never after it.
 */
function findLimitProblems(board: BoardEntry): Problem[] {
  const volts = board.maximumOutputVolts.nominal
  return board.gains.flatMap((gain, i) => {
    const found: Problem[] = []
    const path = ['gains', i, 'overload']
    if (!board.paths.some(({ id }) => id === gain.pathId)) found.push({ path: ['gains', i, 'pathId'], message: `There is no input "${gain.pathId}".` })
    const hertz = gain.overload.map((point) => point.hertz)
    if (hertz.some((value, k) => k > 0 && value <= hertz[k - 1])) found.push({ path, message: 'Frequencies must rise.' })
    const at1kHz = gain.overload.find((point) => point.hertz === 1000)
    if (!at1kHz) return [...found, { path, message: 'Say what it takes at 1 kHz.' }]
    const reached = (at1kHz.millivolts.nominal / 1000) * 10 ** (gain.gainDecibels.nominal / 20)
    const fitting = Number(((volts / 10 ** (gain.gainDecibels.nominal / 20)) * 1000).toPrecision(3))
    if (reached > volts * ROUNDING) {
      found.push({ path, message: `That is more than the output limit, ${volts} V RMS, allows. Did you mean ${fitting} mV?` })
    }
    if (board.topology === 'output-limited' && reached < volts / ROUNDING) {
      found.push({ path, message: `The output limit, ${volts} V RMS, is the same at every gain. Did you mean ${fitting} mV?` })
    }
    return found
  })
}

/** Everything impossible about one board, each with the field it belongs to. */
export function findBoardProblems(board: BoardEntry): Problem[] {
  const lists = { controls: board.controls, groups: board.groups, gains: board.gains, paths: board.paths }
  const found: Problem[] = Object.entries(lists).flatMap(([name, list]) => {
    const id = repeated(list.map((each) => each.id))
    return id === undefined ? [] : [{ path: [name], message: `"${id}" is there twice.` }]
  })
  board.groups.forEach((group, i) => {
    for (const message of findGroupProblems(group, board)) found.push({ path: ['groups', i], message })
  })
  const used = board.groups.flatMap((group) => (group.members ?? []).map((member) => `${group.control} ${member}`))
  const twice = repeated(used)
  if (twice) found.push({ path: ['groups'], message: `Two groups use ${twice}.` })
  return [...found, ...findStateProblems(board), ...findLimitProblems(board)]
}

/** Boards of one model that share an id, or a serial number. */
export function findSerialProblems(boards: Pick<BoardEntry, 'id' | 'serials'>[]): Problem[] {
  const found: Problem[] = []
  const id = repeated(boards.map((board) => board.id))
  if (id !== undefined) found.push({ path: ['boards'], message: `Two boards are called "${id}".` })
  const ends = boards.map(({ serials }) => ({ from: serials.from ?? 0, to: serials.to ?? Infinity }))
  ends.forEach(({ from, to }, i) => {
    if (to < from) found.push({ path: ['boards', i, 'serials'], message: MUST_RISE })
    const clash = ends.findIndex((other, k) => k < i && other.from <= to && from <= other.to)
    if (clash >= 0) found.push({ path: ['boards', i, 'serials'], message: `These serials overlap board "${boards[clash].id}".` })
  })
  return found
}
const MUST_RISE = 'The second serial is lower than the first.'
