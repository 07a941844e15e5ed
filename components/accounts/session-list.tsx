import { PressForm } from '@/components/forms/press-form'
import { timeWords, WAY_WORDS } from '@/lib/accounts/format'
import type { SessionView } from '@/lib/accounts/views'
import type { FormAction } from '@/lib/forms/terms'

interface Props {
  sessions: SessionView[]
  endSession: FormAction
  endAll: FormAction
}

/** Where someone is signed in now, each with the way to end it. */
export function SessionList({ sessions, endSession, endAll }: Props) {
  return (
    <>
      <table className="lst" aria-labelledby="sessions">
        <thead>
          <tr>
            <th scope="col">Browser</th>
            <th scope="col">Network</th>
            <th scope="col">Signed in</th>
            <th scope="col">Last seen</th>
            <th scope="col">
              <span className="vh">End it</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {sessions.map(({ id, device, origin, way, since, lastSeenAt, present }) => (
            <tr key={id} aria-current={present || undefined}>
              <td data-label="Browser">
                {device}
                {present && <b className="sub">This one</b>}
              </td>
              <td data-label="Network">{origin}</td>
              <td data-label="Signed in">
                {timeWords(since)}
                <span className="sub">{WAY_WORDS[way]}</span>
              </td>
              <td data-label="Last seen">{timeWords(lastSeenAt)}</td>
              <td>
                <PressForm action={endSession} values={{ sessionId: id }} label={present ? 'Sign out here' : `Sign out ${device}, signed in ${timeWords(since)}`}>
                  Sign out
                </PressForm>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <PressForm action={endAll}>Sign out everywhere</PressForm>
      <p className="note">A session lasts thirty days at most, seven for staff. A network is written down without its last part.</p>
    </>
  )
}
