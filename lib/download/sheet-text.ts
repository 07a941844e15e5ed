import { ACT_CAUTIONS, type Act } from '@/lib/cautions/texts'
import type { MatchInputs } from '@/lib/match/inputs'
import type { MatchResult } from '@/lib/match/result'
import { describeSetting } from '@/lib/match/setting-words'
import { dayText } from '@/lib/setups/format'
import { findingSentence } from '@/lib/setups/sentences/findings'
import { restRows } from '@/lib/setups/sentences/rests'
import { titleRows } from '@/lib/setups/sentences/title-block'
import { verdictLead, verdictTitle } from '@/lib/setups/sentences/verdict'
import type { HeldRevision, HeldSheet } from './sheets-held'

/** A sheet as plain text, every revision after the other: what a person can read in fifty years. */
export function sheetText(sheet: HeldSheet, held: readonly HeldRevision[]): string {
  const head = [
    `Sheet ${sheet.number}${sheet.name ? `, ${sheet.name}` : ''}`,
    `Made on ${dayText(sheet.createdAt)}. Code ${sheet.code}.`,
    ...(sheet.archivedAt === null ? [] : [`Put away on ${dayText(sheet.archivedAt)}: its code opens nothing.`]),
  ]
  return `${[head.join('\n'), ...held.map(revisionText)].join('\n\n\n')}\n`
}

function revisionText({ letter, createdAt, rulesVersion, engineVersion, inputs, result }: HeldRevision): string {
  const { match, alternatives } = result
  const facts = { inputs, result: match, alternatives }
  const title = `Revision ${letter}, ${dayText(createdAt)}`
  const parts = [
    `${title}\n${'-'.repeat(title.length)}`,
    cautionText(inputs, match),
    [verdictTitle(facts), ...verdictLead(facts)].join('\n'),
    table(titleRows(inputs).map(({ label, value, note }) => [label, note ? `${value} (${note})` : value])),
    ...settingTexts(inputs, match),
    section('What speaks for and against it', (match.chosen?.findings ?? []).map((finding) => `- ${findingSentence(finding, inputs)}`)),
    section('What this rests on', [table(restRows(inputs, match.chosen?.figures ?? null).map(({ value, used, from }) => [value, `${used}. ${from}`]))]),
    `Reckoned from printed data: an electrical match, not a promise. Rules, version ${rulesVersion}; reckoned by version ${engineVersion}.`,
  ]
  return parts.filter(Boolean).join('\n\n')
}

/** The caution of what a hand would touch, whole, before anything that may send it there. */
function cautionText({ preamp }: MatchInputs, { moves, gate }: MatchResult): string {
  if (gate || preamp.controls.length === 0 || moves?.length === 0) return ''
  const touched = moves ? preamp.controls.filter(({ id }) => moves.some(({ control }) => control === id)) : preamp.controls
  const act: Act = touched.some(({ kind }) => kind === 'plugs') ? 'load' : 'switch'
  const { title, before, after, why } = ACT_CAUTIONS[act]
  return [title, `Before: ${before}`, `After: ${after}`, why].join('\n')
}

function settingTexts({ preamp, present }: MatchInputs, { chosen }: MatchResult): string[] {
  if (preamp.controls.length === 0) return []
  const words = (state: NonNullable<typeof present>['left']) => table(describeSetting(preamp, state).map(({ label, value }) => [label, value]))
  const stood = present ? [section('How it stood, left', [words(present.left)]), section('How it stood, right', [words(present.right)])] : []
  return [...stood, ...(chosen ? [section('As advised, both sides', [words(chosen.setting.state)])] : [])]
}

const section = (heading: string, lines: string[]) => (lines.length > 0 ? `${heading}\n${lines.join('\n')}` : '')

function table(rows: (readonly [string, string])[]): string {
  const widest = Math.max(0, ...rows.map(([label]) => label.length))
  return rows.map(([label, value]) => `${label.padEnd(widest + 2)}${value}`).join('\n')
}
