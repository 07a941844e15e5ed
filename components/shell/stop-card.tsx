import { STOP_TEXTS, type StopKind } from '@/lib/cautions/texts'

/** What to do at once, in order. It offers no test, no article and no way to close it. */
export function StopCard({ kind }: { kind: StopKind }) {
  const { title, acts } = STOP_TEXTS[kind]
  return (
    <section className="stop" aria-labelledby={`stop-${kind}`}>
      <h2 id={`stop-${kind}`}>{title}</h2>
      <ol>
        {acts.map((act) => (
          <li key={act}>{act}</li>
        ))}
      </ol>
    </section>
  )
}
