/** How results and inputs are kept as text. JSON knows no infinity, so it is spelt out. */

interface Unbounded {
  unbounded: 1 | -1
}

const isUnbounded = (value: unknown): value is Unbounded =>
  typeof value === 'object' && value !== null && Object.keys(value).length === 1 && 'unbounded' in value

/**
 * A value as JSON text.
 * @param figures rounds every number to so many figures; exact without it
 * @throws Error on something that is not a number where one belongs: it must never be kept
 */
export function toStored(value: unknown, figures?: number): string {
  return JSON.stringify(value, (key, part: unknown) => {
    if (typeof part !== 'number') return part
    if (Number.isNaN(part)) throw new Error(`"${key}" is not a number and cannot be kept.`)
    if (!Number.isFinite(part)) return { unbounded: part > 0 ? 1 : -1 } satisfies Unbounded
    return figures === undefined || Number.isInteger(part) ? part : Number(part.toPrecision(figures))
  })
}

/** The value behind such a text. The caller names the type it was kept as. */
export function fromStored<T>(text: string): T {
  return JSON.parse(text, (_key, part: unknown) => (isUnbounded(part) ? part.unbounded * Infinity : part)) as T
}
