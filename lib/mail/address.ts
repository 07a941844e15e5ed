/** RFC 5321 4.5.3.1.3: 256 octets with the brackets of a path. */
const LONGEST_BYTES = 254

/**
 * Whether a text is one address that mail can go to. Looser than a form: letters of every alphabet, plus signs and
 * apostrophes pass. Tighter than the standard: no quoted names, comments or bare IP addresses, and nothing that could
 * end a header line or start a second address.
 */
export function isOneAddress(text: string): boolean {
  return Buffer.byteLength(text) <= LONGEST_BYTES && /^[^\s\p{Cc}@<>()[\]\\,;:"]+@[^\s\p{Cc}@<>()[\]\\,;:"]+$/u.test(text)
}
