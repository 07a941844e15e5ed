import type { Metadata } from 'next'
import { Part } from '@/components/site/part'
import { WriteToUs } from '@/components/site/write-to-us'

export const metadata: Metadata = { title: 'Accessibility' }

export default function AccessibilityPage() {
  return (
    <main id="main" className="w pg">
      <h1>Accessibility</h1>
      <p className="lead">
        Whether a cartridge suits is a plain sentence here, and so is every switch to move. Nothing has to be seen in a
        drawing or told by its colour.
      </p>
      <Part id="aim" title="What we hold to">
        <p>
          The Web Content Accessibility Guidelines 2.2, level AA. Each change to the service is tested against them by
          program, light and dark, on a desk and on a phone.
        </p>
      </Part>
      <Part id="how" title="What that means here">
        <ul>
          <li>Everything can be done with the keyboard, and what has the focus has a thick ring round it.</li>
          <li>Every plot has a table behind it, and its finding stands over it in words. Switches are listed by number.</li>
          <li>Text can be made twice as large, and pages fit a width of 320 points without scrolling sideways.</li>
          <li>The look follows your device, light or dark, and can be set at the foot of each page.</li>
          <li>Nothing moves by itself. What slides when you press it jumps instead, if your device asks for less motion.</li>
          <li>You can check, save and sign in with script switched off.</li>
          <li>A sheet prints on one page, in ink that a grey printer keeps apart.</li>
          <li>Our mail reads the same with pictures off, and as plain text.</li>
        </ul>
      </Part>
      <Part id="not-yet" title="What does not work yet">
        <ul>
          <li>It speaks English only.</li>
          <li>Without script, drawings keep one size, cartridges are not found while you type, and a flipped switch changes nothing.</li>
          <li>We have tested by program and by keyboard. People who use a screen reader every day have not tested it for us yet.</li>
        </ul>
      </Part>
      <Part id="tell-us" title="Something in your way?">
        <p>
          Write to <WriteToUs />, in whatever way suits you, and say which page it was. What you wanted from the page we
          can tell you by mail as well. We answer on working days.
        </p>
        <p>Where you live the law may give you more than this page does. Then the law goes first.</p>
      </Part>
    </main>
  )
}
