import type { RawAnswers } from './trouble'
import { isValueField, type AnswerKey, type NumberField } from './terms'

/**
 * Values that were filled in from the catalogue and not touched since. Each leaves a short mark of what it said under
 * `leaflet`; a value that says something else by now is the owner's. This needs no script and survives a copied link.
 */

function keysOf(field: NumberField): AnswerKey[] {
  if (!isValueField(field)) return [field]
  const keys: AnswerKey[] = [field, `${field}To`, `${field}How`]
  if (field === 'output') return [...keys, 'velocity', 'velocityOther', 'meaning']
  return field === 'compliance' ? [...keys, 'complianceAt'] : keys
}

/** FNV-1a, 32 bits: a fixed short name for a text, no secret. */
function shortName(text: string): string {
  let hash = 0x811c9dc5
  for (const char of text) hash = Math.imul(hash ^ (char.codePointAt(0) ?? 0), 0x01000193)
  return (hash >>> 0).toString(36)
}

/** An answer that was never given and one given as "one value" are the same. */
function markOf(field: NumberField, answers: RawAnswers): string {
  const said = keysOf(field).map((key) => (answers[key] === 'one' ? '' : (answers[key] ?? '').trim()))
  return `${field}.${shortName(said.join('\n'))}`
}

/** True when the value stands as it was filled in. */
export function isFromLeaflet(field: NumberField, answers: RawAnswers): boolean {
  return (answers.leaflet ?? '').split(' ').includes(markOf(field, answers))
}

/**
 * The marks of values that were filled in just now, beside those of other fields.
 * @param fields what was filled in
 * @param touched what else was emptied or replaced with it, and loses its mark
 */
export function withMarks(answers: RawAnswers, fields: readonly NumberField[], touched = fields): RawAnswers {
  const gone = [...fields, ...touched].map((field) => `${field}.`)
  const kept = (answers.leaflet ?? '').split(' ').filter((mark) => mark && !gone.some((start) => mark.startsWith(start)))
  return { ...answers, leaflet: [...kept, ...fields.map((field) => markOf(field, answers))].join(' ') }
}
