import type { TemplateProps } from '@/lib/mail/templates'
import type { TemplateName } from '@/lib/mail/terms'
import { addressChanged } from './address-changed'
import { alreadyJoined } from './already-joined'
import { changeAddress } from './change-address'
import { confirm } from './confirm'
import { deletionAsked } from './deletion-asked'
import { invitation } from './invitation'
import type { MailKind } from './kind'
import { link } from './link'
import { newSignIn } from './new-sign-in'
import { reset } from './reset'

/** Every mail, by its name in the outbox. */
export const MAIL_KINDS: { [Name in TemplateName]: MailKind<TemplateProps[Name]> } = {
  confirm,
  link,
  reset,
  invitation,
  'change-address': changeAddress,
  'address-changed': addressChanged,
  'new-sign-in': newSignIn,
  'already-joined': alreadyJoined,
  'deletion-asked': deletionAsked,
}
