import Link from 'next/link'
import type { SheetView } from '@/lib/setups/views'
import { CopyLink } from './sheet-buttons'
import { QrCode } from './qr-code'
import { SheetForm } from './sheet-form'

interface Props {
  number: number
  code: string
  /** The whole link. */
  address: string
  /** False where only its owner may make a new code. */
  mayChange: boolean
  keeping: SheetView['keeping']
}

/** Keep it, pass it on: the number to say, the code that opens it, a link and a square to point a phone at. */
export function KeepIt({ number, code, address, mayChange, keeping }: Props) {
  return (
    <section className="fig low no-p" id="keep">
      <div className="say">
        <span className="fn">Keep it, pass it on</span>
        <h2>Sheet {number}</h2>
      </div>
      <div className="keep">
        <QrCode text={address} size={132} label="The link to this sheet, to point a phone at" />
        <div>
          <h3>To say on the phone: {number}</h3>
          <p>The number alone opens nothing. It is how we find your sheet.</p>
          <p>Saved. Whoever has the code can open it.</p>
          {keeping === 'nobody' && (
            <p>
              <Link href={`/shelf/sheets/add?sheet=${code}`} prefetch={false}>
                Put it on my shelf
              </Link>
              . Then only you can change it.
            </p>
          )}
          {keeping === 'own' && (
            <p>
              It is yours: <Link href={`/shelf/sheets/${number}`}>its name, its revisions, its place</Link>.
            </p>
          )}
        </div>
        <div>
          <h3>To open it: the code</h3>
          <p>
            <code>{code}</code>
          </p>
          <p>
            <CopyLink address={address} />
          </p>
          {mayChange && (
            <>
              <SheetForm act="new-code" code={code} button="lnk">
                Make a new code
              </SheetForm>
              <p className="note">After that the old code and every link with it open nothing.</p>
            </>
          )}
        </div>
      </div>
    </section>
  )
}
