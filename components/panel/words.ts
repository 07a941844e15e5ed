/** Small pieces of sentences about controls. */

const NUMBERS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten', 'eleven', 'twelve']

/** A small count as a word; figures from thirteen on. */
export function countInWords(count: number): string {
  return NUMBERS[count] ?? String(count)
}

/** "1", "1 and 7", "MC, 400 Ω and Rumble". */
export function listed(parts: readonly (string | number)[]): string {
  if (parts.length < 2) return parts.join('')
  return `${parts.slice(0, -1).join(', ')} and ${parts[parts.length - 1]}`
}

/** Numbers of switches, three or more in a row as a span: "1, 3 to 5 and 8". */
export function listedNumbers(numbers: readonly number[]): string {
  const runs: number[][] = []
  for (const number of numbers) {
    const last = runs.at(-1)
    if (last && last[last.length - 1] === number - 1) last.push(number)
    else runs.push([number])
  }
  return listed(runs.flatMap((run): (string | number)[] => (run.length > 2 ? [`${run[0]} to ${run[run.length - 1]}`] : run)))
}

/** A label inside a sentence: "Load" is "load", "MC load" stays. */
export function inSentence(label: string): string {
  return /^\p{Lu}\p{Ll}/u.test(label) ? label[0].toLowerCase() + label.slice(1) : label
}

export function capitalised(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1)
}

/** Two values of one unit name it once: "from 42 to 36 dB". */
export function fromTo(before: string, after: string): string {
  const unit = / \S+$/.exec(before)?.[0]
  const start = unit && after.endsWith(unit) ? before.slice(0, -unit.length) : before
  return `from ${start} to ${after}`
}

/** What all these labels end in, such as "dB", when they do; the labels then stand without it. */
export function sharedUnit(labels: readonly string[]): { unit: string; short: string[] } {
  const parts = labels.map((label) => /^(\S+) (\S+)$/.exec(label))
  const unit = parts[0]?.[2]
  if (labels.length < 2 || !unit || parts.some((part) => part?.[2] !== unit)) return { unit: '', short: [...labels] }
  return { unit, short: parts.map((part) => part?.[1] ?? '') }
}
