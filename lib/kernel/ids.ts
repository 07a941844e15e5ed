import { randomBytes } from 'node:crypto'

/** No vowels and nothing that reads two ways, so an id never spells a word and can be read out. */
const LETTERS = '23456789bcdfghjkmnpqrstvwxyz'
/** 28 letters, 22 of them: 105 bits. */
const ID_LENGTH = 22

/**
 * Letters nobody can guess.
 * @param length how many; each carries log2(28), about 4.8 bits
 */
export function randomLetters(length: number): string {
  // Bytes from 252 up are thrown away: 252 is the last multiple of 28, so every letter is equally likely.
  const limit = 256 - (256 % LETTERS.length)
  let letters = ''
  while (letters.length < length) {
    for (const byte of randomBytes(length * 2)) {
      if (byte < limit && letters.length < length) letters += LETTERS[byte % LETTERS.length]
    }
  }
  return letters
}

/** A new id that says its kind: `newId('set')` gives `set_…`. */
export function newId(prefix: string): string {
  return `${prefix}_${randomLetters(ID_LENGTH)}`
}
