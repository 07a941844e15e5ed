/** Plain text as it is, with its links to follow. */
export function LinkedText({ text }: { text: string }) {
  // Split by what is captured, every second piece is a link.
  const pieces = text.split(/(https?:\/\/\S+)/)
  return (
    <p className="pln">
      {pieces.map((piece, index) =>
        index % 2 === 1 ? (
          <a key={index} href={piece} rel="noreferrer">
            {piece}
          </a>
        ) : (
          piece
        ),
      )}
    </p>
  )
}
