import { HazardLine, HazardRow } from '@/components/shell/hazard-line'
import { PlaceLink } from '@/components/shell/place-link'

export default function HomePage() {
  return (
    <main id="main" className="w">
      <div className="top1">
        <HazardLine />
      </div>
      <section className="hero">
        <h1>Will this cartridge suit your preamp?</h1>
        <p className="lead">
          Answer four short questions. You get a plain yes or no, the switches to move, and a sheet to print and keep.
          If you do not know a value, say so and we work with a range.
        </p>
        <PlaceLink className="b pri" href="/check">
          Check a cartridge
        </PlaceLink>
      </section>
      <section className="two" aria-labelledby="wrong">
        <h2 id="wrong">Does something sound wrong?</h2>
        <HazardRow />
      </section>
    </main>
  )
}
