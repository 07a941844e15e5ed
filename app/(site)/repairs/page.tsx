import type { Metadata } from 'next'
import { CautionBox } from '@/components/shell/caution-box'
import { HazardLine } from '@/components/shell/hazard-line'
import { PlaceLink } from '@/components/shell/place-link'
import { Part } from '@/components/site/part'
import { WriteToUs } from '@/components/site/write-to-us'
import { MAKER } from '@/lib/maker/terms'

export const metadata: Metadata = { title: 'Repairs' }

export default function RepairsPage() {
  return (
    <main id="main" className="w pg">
      <div className="top1">
        <HazardLine />
      </div>
      <h1>Repairs</h1>
      <p className="lead">
        Much that sounds broken is a setting. Check that first. If it is broken, the workshop repairs it; this service
        cannot.
      </p>
      <Part id="first" title="Before you ask">
        <p>
          <PlaceLink href="/check">Check your cartridge</PlaceLink> with the preamp it plays into. The sheet says whether
          the two suit each other and how the switches should stand. Too quiet, too dull, too bright and harsh on loud
          records are often in there.
        </p>
        <p>Does the sheet say that it suits, and it still sounds wrong? Then ask the workshop, and name the sheet by its number.</p>
      </Part>
      <Part id="yourself" title="What not to do yourself">
        <p>
          Do not open a preamp. There is nothing in it to set, and there can be mains and high voltage inside, also
          after it is off. Do not change the fuse, the adapter or the earth to get round a fault.
        </p>
        <p>House wiring is for an electrician where you are. Its rules are local, and we cannot judge it from here.</p>
      </Part>
      <Part id="workshop" title="Ask the workshop">
        <p>
          Write to {MAKER.fullName} at <WriteToUs /> and wait for the answer before you send anything. Say:
        </p>
        <ul>
          <li>which model it is, and the serial number on its rear panel;</li>
          <li>what you hear, on which side, since when, and whether every record does it;</li>
          <li>the number of your sheet, if you have one, and which country’s mains it runs on.</li>
        </ul>
        <p>If we ask you to send it, this goes before the plugs come out:</p>
        <CautionBox act="plug" />
        <p>Pack it so that it cannot move, with a note of your name and address.</p>
      </Part>
      <Part id="rights" title="Guarantee and rights">
        <p>
          What you may ask of a seller or a maker, and for how long, is for the law where you bought it and for the
          papers that came with it. This page takes nothing away from either. Nor does a sheet: it is reckoned from
          printed data, an electrical match and not a promise.
        </p>
        <p>Another workshop may repair it as well. On your sheet are the settings it needs to know.</p>
      </Part>
    </main>
  )
}
