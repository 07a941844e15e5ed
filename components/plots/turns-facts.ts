import { clamp, plainNumber } from './numbers'

export type TurnVerdict = 'suits' | 'changes' | 'limit' | 'no' | 'unsure'

/** From here to there along the one unknown, this advice. Display numbers. */
export interface TurnStretch {
  from: number
  to: number
  verdict: TurnVerdict
  /** What to do there, in a few words: "Gain to 56 dB". */
  text: string
}

export interface Turns {
  min: number
  max: number
  unit: string
  /** Where the unknown may be. */
  low: number
  high: number
  stretches: TurnStretch[]
  ticks: number[]
}

export const TURN_WORDS: Record<TurnVerdict, string> = {
  suits: 'Suits',
  changes: 'With changes',
  limit: 'With a limit',
  no: 'Does not suit',
  unsure: 'Cannot say yet',
}

/** More than this cannot be taken in; the small ones are joined to their longer neighbour. */
export const MOST_STRETCHES = 4

const lengthOf = ({ from, to }: TurnStretch) => (from > 0 ? Math.log(to / from) : to - from)

/** Stretches that can be drawn, in order, inside the axis, neighbours that say the same in one, four at most. */
export function joinedStretches({ min, max, stretches }: Turns): TurnStretch[] {
  const inside = stretches
    .map((stretch) => ({ ...stretch, from: Math.max(min, stretch.from), to: Math.min(max, stretch.to) }))
    .filter(({ from, to }) => from < to)
    .sort((a, b) => a.from - b.from)
  const joined: TurnStretch[] = []
  for (const stretch of inside) {
    const last = joined.at(-1)
    if (last && last.verdict === stretch.verdict && last.text === stretch.text) last.to = Math.max(last.to, stretch.to)
    else joined.push({ ...stretch })
  }
  while (joined.length > MOST_STRETCHES) {
    const shortest = joined.reduce((least, stretch, i) => (lengthOf(stretch) < lengthOf(joined[least] ?? stretch) ? i : least), 0)
    const [gone] = joined.splice(shortest, 1)
    const [before, after] = [joined[shortest - 1], joined[shortest]]
    if (!gone) break
    if (before && (!after || lengthOf(before) >= lengthOf(after))) before.to = gone.to
    else if (after) after.from = gone.from
  }
  return joined
}

/** "under 0.35 mV", "0.35 to 0.85 mV", "over 1.7 mV", or the whole axis. */
export function stretchText({ from, to }: TurnStretch, { min, max, unit }: Turns): string {
  if (from <= min && to >= max) return `${plainNumber(min)} to ${plainNumber(max)} ${unit}`
  if (from <= min) return `under ${plainNumber(to)} ${unit}`
  if (to >= max) return `over ${plainNumber(from)} ${unit}`
  return `${plainNumber(from)} to ${plainNumber(to)} ${unit}`
}

/** Where the unknown may be, held to the axis; all of it while an end is not known. */
export function whereabouts({ min, max, low, high }: Turns): { low: number; high: number } {
  const [from, to] = [Number.isFinite(low) ? low : min, Number.isFinite(high) ? high : max]
  return { low: clamp(Math.min(from, to), min, max), high: clamp(Math.max(from, to), min, max) }
}

export function turnsSentence(turns: Turns): string {
  const { unit } = turns
  const { low, high } = whereabouts(turns)
  const stretches = joinedStretches(turns)
    .map((stretch) => `${stretchText(stretch, turns)}: ${TURN_WORDS[stretch.verdict]}${stretch.text ? `, ${stretch.text}` : ''}`)
    .map((sentence) => ` ${sentence}.`)
    .join('')
  return `Where our advice changes. It is somewhere from ${plainNumber(low)} to ${plainNumber(high)} ${unit}.${stretches}`
}
