import type { ControlState, Group, Preamp, SwitchBank } from '@/lib/match'
import { isActive } from '@/lib/match/groups'
import { describeGroup } from '@/lib/match/setting-words'
import { textWidth } from '../plots/text-width'

/** The brackets under a bank: which switches belong together, and what they come to. */
export interface BracketLabel {
  id: string
  from: number
  to: number
  middle: number
  label: string
  value: string
  /** 0 stands right under the bracket; words that would run into their neighbour stand lower. */
  tier: number
}

/** Narrower than the data cut, by this much on the average. */
const EXTRA_CONDENSED = 0.825
const APART = 2

export const SMALL_LABEL_UNDER = 31

/** Members in a row, such as 3 to 5; a group whose switches do not stand side by side has several. */
function runsOf(members: number[]): [number, number][] {
  const runs: [number, number][] = []
  for (const member of [...members].sort((a, b) => a - b)) {
    const last = runs.at(-1)
    if (last && last[1] === member - 1) last[1] = member
    else runs.push([member, member])
  }
  return runs
}

export function bracketLabels(preamp: Preamp, bank: SwitchBank, state: ControlState, switchWidth: number): BracketLabel[] {
  const size = switchWidth < SMALL_LABEL_UNDER ? 13.5 : 15
  const everySwitch = Array.from({ length: bank.switchCount }, (_, index) => index + 1)
  const groups = preamp.groups.filter(({ control }) => control === bank.id)
  const membersOf = ({ members }: Group) => members ?? everySwitch
  const inUse = new Set(groups.filter((group) => isActive(preamp, group, state)).flatMap(membersOf))
  // Switches that mean one thing with one input and another with the other are named for what they do now.
  const runs = groups
    .filter((group) => isActive(preamp, group, state) || !membersOf(group).every((member) => inUse.has(member)))
    .flatMap((group) => runsOf(membersOf(group)).map(([first, last]) => ({ group, first, last })))
    .sort((a, b) => a.first - b.first)
  const ends: number[] = []
  return runs.map(({ group, first, last }) => {
    const from = (first - 1) * switchWidth + 6
    const to = last * switchWidth - 4
    const middle = (from + to) / 2
    const value = describeGroup(preamp, group, state)
    const half = Math.max(textWidth(group.label, { size }) * EXTRA_CONDENSED, textWidth(value, { size: 15, bold: true })) / 2
    const free = ends.findIndex((end) => end + APART <= middle - half)
    const tier = free < 0 ? ends.length : free
    ends[tier] = middle + half
    return { id: `${group.id} ${first}`, from, to, middle, label: group.label, value, tier }
  })
}
