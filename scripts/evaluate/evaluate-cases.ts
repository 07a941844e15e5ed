import { usualKeys, valueOf, type Value } from './figures'
import type { Inputs } from './inputs'
import { CASE_KINDS } from './kinds'

export interface Case {
  readonly id: string
  readonly kind: string
  readonly inputs: Inputs
  /** Only its keys are read: they say which figures are wanted. */
  readonly expected: Readonly<Record<string, unknown>> | null
}

export type CaseResult = Readonly<Record<string, Value>> | { readonly error: string }

/** Cases of a parsed file: `{ "cases": […] }` or a bare list. @throws Error with a sentence for anything else */
export function casesOf(file: unknown): Case[] {
  const list = isRecord(file) ? file['cases'] : file
  if (!Array.isArray(list)) throw new Error('The file holds no list of cases.')
  return list.map((entry: unknown, index) => {
    const record = isRecord(entry) ? entry : {}
    const { id, kind, inputs, expected } = record
    return {
      id: typeof id === 'string' || typeof id === 'number' ? String(id) : `case ${index + 1}`,
      kind: typeof kind === 'string' ? kind : '',
      inputs: isRecord(inputs) ? inputs : {},
      expected: isRecord(expected) ? expected : null,
    }
  })
}

/** Figures of one case. A key that its kind does not know is null and is reported to `unknownKey`. */
export function evaluateCase({ kind, inputs, expected }: Case, unknownKey: (key: string) => void = () => {}): CaseResult {
  const figuresOf = Object.hasOwn(CASE_KINDS, kind) ? CASE_KINDS[kind] : undefined
  if (!figuresOf) return { error: `No such kind of case: "${kind}".` }
  try {
    const figures = figuresOf(inputs)
    const keys = expected ? Object.keys(expected) : usualKeys(figures)
    return Object.fromEntries(
      keys.map((key) => {
        const value = valueOf(figures, key)
        if (value === undefined) unknownKey(key)
        return [key, value ?? null]
      }),
    )
  } catch (problem) {
    return { error: problem instanceof Error ? problem.message : String(problem) }
  }
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
}
