/** Figures of one case by key: named ones, and series whose keys carry their own frequency or order. */

export type Value = number | null

/** Keys such as `response_{f}_re_emf_dB`: `{f}` stands for 15kHz or 15000Hz, `{n}` for a whole number. */
export interface Series {
  readonly template: string
  /** What fills the places when nothing says which keys are wanted. */
  readonly usual: readonly (readonly string[])[]
  readonly value: (...numbers: number[]) => Value
}

export interface Figures {
  readonly named: Readonly<Record<string, () => Value>>
  readonly series: readonly Series[]
}

/** The keys to print when a case does not say. */
export function usualKeys({ named, series }: Figures): string[] {
  const fill = (template: string, parts: readonly string[]) => parts.reduce((key, part) => key.replace(/\{[fn]\}/, part), template)
  return [...Object.keys(named), ...series.flatMap(({ template, usual }) => usual.map((parts) => fill(template, parts)))]
}

/** Value of a key, or undefined when this kind has no such figure. What has no finite value is null. */
export function valueOf({ named, series }: Figures, key: string): Value | undefined {
  const figure = Object.hasOwn(named, key) ? named[key] : undefined
  if (figure) return finite(figure())
  for (const { template, value } of series) {
    const numbers = numbersOf(template, key)
    if (numbers) return finite(value(...numbers))
  }
  return undefined
}

function numbersOf(template: string, key: string): number[] | null {
  const pattern = template.replaceAll('{f}', '(\\d+(?:\\.\\d+)?k?)Hz').replaceAll('{n}', '(\\d+)')
  const match = new RegExp(`^${pattern}$`).exec(key)
  return match && match.slice(1).map((text) => (text.endsWith('k') ? Number(text.slice(0, -1)) * 1000 : Number(text)))
}

function finite(value: Value): Value {
  return value !== null && Number.isFinite(value) ? value : null
}

/** Frequencies as they stand in keys. */
export function atHertz(...hertz: number[]): string[][] {
  return hertz.map((f) => [`${f}Hz`])
}
