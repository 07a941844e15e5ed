import { randomLetters } from '../kernel/ids'

/** Four groups of four: 77 bits, so nobody finds a sheet by trying. */
const GROUPS = 4
const LETTERS_A_GROUP = 4
const CODE = new RegExp(`^[2-9b-z]{${GROUPS * LETTERS_A_GROUP}}$`)

/** A new code for a sheet, such as "k7m2-w9qd-h4tx-p3rt". */
export function newSheetCode(): string {
  return grouped(randomLetters(GROUPS * LETTERS_A_GROUP))
}

/** A code as it is kept, whatever the case, the gaps and the hyphens it was typed with; null when it is none. */
export function readSheetCode(text: string): string | null {
  const letters = text.toLowerCase().replace(/[\s-]/g, '')
  return CODE.test(letters) ? grouped(letters) : null
}

function grouped(letters: string): string {
  return (letters.match(new RegExp(`.{${LETTERS_A_GROUP}}`, 'g')) ?? []).join('-')
}
