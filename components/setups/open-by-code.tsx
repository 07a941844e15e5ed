import Link from 'next/link'
import { FieldError } from './field-error'

/** A box for the code on a printed sheet. A plain form: it needs no script. */
export function OpenByCode({ code = '', refused }: { code?: string; refused?: string }) {
  return (
    <form action="/sheets" method="get">
      <label className="q" htmlFor="code">
        The code on the sheet
      </label>
      <div className="row">
        <span className={refused ? 'in bad' : 'in'}>
          <input
            id="code"
            name="code"
            className="code-in"
            defaultValue={code}
            maxLength={40}
            autoComplete="off"
            autoCapitalize="none"
            spellCheck={false}
            aria-invalid={refused !== undefined}
            aria-describedby={refused ? 'code-error' : undefined}
            required
          />
        </span>
        <button type="submit" className="b pri">
          Open the sheet
        </button>
      </div>
      {refused && <FieldError id="code-error">{refused}</FieldError>}
      <p className="note">
        No sheet yet? <Link href="/check">Check a cartridge</Link>
      </p>
    </form>
  )
}
