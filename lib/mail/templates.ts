import { z } from 'zod'
import type { TemplateName } from './terms'

/** A page of ours. Only the web's two schemes: anything else in a mail's link would be someone's trick. */
const link = z.url({ protocol: /^https?$/ })
/** How long a link works. */
const minutes = z.number().int().positive()
const time = z.number().int().positive()
/** Text that stands within one line; line ends and other controls could start a header of their own. */
const line = z.string().trim().min(1).max(200).regex(/^\P{Cc}*$/u)
/** Which of the two addresses a mail about changing them goes to. */
const end = z.enum(['old', 'new'])

/** What each mail needs to be written. Every link is whole, with the site's address. */
export const TEMPLATE_PROPS = {
  /** To someone who joined: is this address yours? */
  confirm: z.object({ link, minutes }),
  /** A link that signs someone in, once. */
  link: z.object({ link, minutes }),
  /** A link to choose a new password, once. */
  reset: z.object({ link, minutes }),
  /** To someone whom an admin lets into the workshop. */
  invitation: z.object({ link, minutes, invitedBy: line, role: z.enum(['staff', 'admin']) }),
  /** To both ends when someone asks for another address; each has a link of its own, and both are needed. */
  'change-address': z.object({ end, oldAddress: line, newAddress: line, link, minutes }),
  /** To both ends once it is changed. */
  'address-changed': z.object({ end, oldAddress: line, newAddress: line }),
  /** A sign-in from a browser not seen before. `link` leads to the list of sessions; `browser` such as "Firefox on Linux". */
  'new-sign-in': z.object({ link, at: time, browser: line, way: z.enum(['password', 'link']) }),
  /** To someone who joins with an address that has an account. `link` leads to signing in, `resetLink` to a new password. */
  'already-joined': z.object({ link, resetLink: link }),
  /** Someone asked to delete their account. `link` leads to keeping it, `deletesAt` is when it goes. */
  'deletion-asked': z.object({ link, deletesAt: time }),
} satisfies Record<TemplateName, z.ZodType>

export type TemplateProps = { [Name in TemplateName]: z.infer<(typeof TEMPLATE_PROPS)[Name]> }

/** A mail to be written, with its template and what that needs. */
export type MailWords = { [Name in TemplateName]: { template: Name; props: TemplateProps[Name] } }[TemplateName]
