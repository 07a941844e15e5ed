/** Letters that do not come apart into a base letter and a mark. */
const WHOLE_LETTERS: Record<string, string> = { ß: 'ss', æ: 'ae', œ: 'oe', ø: 'o', đ: 'd', ð: 'd', ł: 'l', þ: 'th', ı: 'i' }

/** Text without capitals and accents, for comparing: "Éclair Ø" and "eclair o" come to the same. */
export function fold(text: string): string {
  return text
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[ßæœøđðłþı]/g, (letter) => WHOLE_LETTERS[letter])
}

/** The words of a text, folded; everything that is neither letter nor digit parts them. */
export function foldedWords(text: string): string[] {
  return fold(text).split(/[^\p{L}\p{N}]+/u).filter(Boolean)
}
