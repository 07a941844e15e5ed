import { PreampRows } from '@/components/home/preamp-rows'
import { Specimen } from '@/components/home/specimen'
import { HazardLine, HazardRow } from '@/components/shell/hazard-line'
import { PlaceLink } from '@/components/shell/place-link'
import { listPreamps } from '@/lib/catalogue/queries'
import { requestContext } from '@/lib/server/request-context'
import { exampleCheck } from '@/lib/setups/example'
import { verdictTitle } from '@/lib/setups/sentences/verdict'

export default async function HomePage() {
  const context = await requestContext()
  const preamps = listPreamps(context)
  const example = exampleCheck(context)
  return (
    <main id="main" className="w">
      <div className="top1">
        <HazardLine />
      </div>
      <section className="hero">
        <div>
          <h1>Will this cartridge suit your preamp?</h1>
          <p className="lead">
            Answer four short questions. You get a plain yes or no, the switches to move, and a sheet to print and keep.
            If you do not know a value, say so and we work with a range.
          </p>
          <PlaceLink className="b pri" href="/check">
            Check a cartridge
          </PlaceLink>
        </div>
        {example && (
          <Specimen
            inputs={example.inputs}
            result={example.result.match}
            title={verdictTitle({ inputs: example.inputs, result: example.result.match, alternatives: example.result.alternatives })}
          />
        )}
      </section>
      {preamps.length > 0 && (
        <section className="two" aria-labelledby="which">
          <div>
            <h2 id="which">Which preamp is yours?</h2>
            <p>Look at the back. The name is by the output sockets.</p>
          </div>
          <PreampRows preamps={preamps} />
        </section>
      )}
      <section className="two" aria-labelledby="wrong">
        <h2 id="wrong">Does something sound wrong?</h2>
        <HazardRow />
      </section>
    </main>
  )
}
