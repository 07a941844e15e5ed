import { dayText, tied } from '@/lib/setups/format'
import { paperLine } from '@/lib/setups/sentences/headings'
import type { Evaluation } from '@/lib/match/result'
import { QrCode } from './qr-code'

/** Room at each pitch, arm and noise in one line: on paper their drawings make room for the moves. */
export function PaperLine({ evaluation }: { evaluation: Evaluation }) {
  const { room, arm, noise } = paperLine(evaluation)
  return (
    <section className="p-only">
      <table className="prn">
        <tbody>
          <tr>
            <th scope="row">Room at each pitch</th>
            <td>{tied(room)}</td>
            <th scope="row">Arm</th>
            <td>{tied(arm)}</td>
            <th scope="row">Noise</th>
            <td>{tied(noise)}</td>
          </tr>
        </tbody>
      </table>
    </section>
  )
}

export const PROMISE = 'Reckoned from printed data: an electrical match, not a promise.'

interface FootProps {
  number: number
  letter: string
  createdAt: number
  code: string
  address: string
  rulesVersion: number
}

/** The foot of the printed page: how to open it again. */
export function PaperFoot({ number, letter, createdAt, code, address, rulesVersion }: FootProps) {
  return (
    <div className="p-only pfoot">
      <QrCode text={address} size={60} label="The link to this sheet" />
      <span>
        Sheet {number}, revision {letter}, {dayText(createdAt)}. Code {code}. {PROMISE} Rules, version {rulesVersion}.
        <br />
        Keep this page with the preamp.
      </span>
    </div>
  )
}
