/** Letters of a sheet in a row, the one in use on ink. Said as words to those who cannot see them. */
export function RevisionLetters({ letters, inUse = letters[letters.length - 1] }: { letters: readonly string[]; inUse?: string }) {
  const words = letters.length === 1 ? `Revision ${inUse}` : `Revisions ${letters[0]} to ${letters[letters.length - 1]}, ${inUse} in use`
  return (
    <span className="rv" role="img" aria-label={words}>
      {letters.map((letter) => (
        <b key={letter} className={letter === inUse ? 'on' : undefined} aria-hidden="true">
          {letter}
        </b>
      ))}
    </span>
  )
}
