import type { Act } from '@/lib/cautions/texts'
import { MailCaution } from './caution'
import { BeforeAndAfter, type Comparison } from './comparison'
import type { MailKind } from './kind'
import { Layout } from './layout'
import { Action, CopyLink, Head1, Note, Words } from './parts'

interface TicketMail {
  subject: string
  /** Never a move without its caution: it is read where the caution is not. */
  preview: string
  /** "Ticket 2094". */
  ticket: string
  /** The moves, or what happened. */
  heading: string
  /** What the person wrote, a paragraph each. */
  words: string[]
  /** "Ruth at the workshop, Thursday 12 March, 11:02". */
  signed: string
  /** What the moves ask for; each brings its caution, whole. */
  acts: Act[]
  comparison: Comparison | null
  action: { words: string; href: string }
  /** What follows, and what does not, until they press. */
  promise: string[]
}

/** What every mail about a ticket is put into. */
export const ticketFrame: MailKind<TicketMail> = {
  subject: ({ subject }) => subject,
  samples: [
    {
      subject: 'Ruth has answered, and suggests revision B',
      preview: 'Your cartridge is fine. Two switches to move, with the caution that goes before them.',
      ticket: 'Ticket 2094',
      heading: 'Ruth suggests moving 1 and 7 to OFF',
      words: ['Your cartridge is fine. Your arm and lead already supply 130 to 150 pF, and the Tarn 2 another 70.'],
      signed: 'Ruth at the workshop, Thursday 12 March, 11:02',
      acts: ['switch'],
      comparison: {
        head: ['Sheet 4471', 'Now, A', 'With B'],
        rows: [
          ['Verdict', 'Suits, with changes', 'Suits'],
          ['Capacitance', '360 to 420 pF', '200 to 220 pF'],
          ['Loud records', 'over by 2.9 dB', '3.1 dB of room'],
        ],
      },
      action: { words: 'See what changes, and take it up', href: 'https://setup.oskerby.example/tickets/2094' },
      promise: [
        'Nothing changes until you say so, and you can undo it.',
        'Reckoned from printed data: an electrical match, not a promise.',
      ],
    },
  ],
  Body: ({ preview, ticket, heading, words, signed, acts, comparison, action, promise, site }) => (
    <Layout preview={preview} about={ticket} because="You get this because you asked the workshop." site={site}>
      <Head1>{heading}</Head1>
      {words.map((paragraph) => (
        <Words key={paragraph}>{paragraph}</Words>
      ))}
      <Note>{signed}</Note>
      {acts.map((act) => (
        <MailCaution key={act} act={act} />
      ))}
      {comparison && <BeforeAndAfter {...comparison} />}
      <Action href={action.href}>{action.words}</Action>
      <CopyLink href={action.href} />
      {promise.map((sentence) => (
        <Note key={sentence}>{sentence}</Note>
      ))}
    </Layout>
  ),
}
