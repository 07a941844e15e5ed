/** What happened, read out as it appears. */
export function Said({ words }: { words: string | null }) {
  return <div role="status">{words && <p className="said">{words}</p>}</div>
}
