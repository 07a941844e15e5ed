import { CopyLink } from './sheet-buttons'
import { QrCode } from './qr-code'
import { SheetForm } from './sheet-form'
import type { SheetAction } from './sheet-actions'

interface Props {
  number: number
  code: string
  /** The whole link. */
  address: string
  /** Null where only its owner may. */
  makeNewCode: SheetAction | null
}

/** Keep it, pass it on: the number to say, the code that opens it, a link and a square to point a phone at. */
export function KeepIt({ number, code, address, makeNewCode }: Props) {
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
        </div>
        <div>
          <h3>To open it: the code</h3>
          <p>
            <code>{code}</code>
          </p>
          <p>
            <CopyLink address={address} />
          </p>
          {makeNewCode && (
            <>
              <SheetForm action={makeNewCode} code={code} button="lnk">
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
