import { QrCode } from '@/components/setups/qr-code'
import type { PendingSecondFactorView } from '@/lib/accounts/views'

/** In groups of four, for typing. */
const inGroups = (secret: string) => secret.match(/.{1,4}/g)?.join(' ')

/** How a secret comes into an authenticator app: by the camera, or typed. */
export function BringSecret({ secret, address }: PendingSecondFactorView) {
  return (
    <>
      <h2>Point the app at this</h2>
      <p>Any authenticator app that shows six figures will do.</p>
      <QrCode text={address} size={220} label="Square code with the secret. It stands below as text." />
      <p>
        Without a camera, type this into the app: <b className="codes">{inGroups(secret)}</b>
      </p>
    </>
  )
}
