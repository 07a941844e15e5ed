import type { ReactElement } from 'react'

/** A mail's props and the site that its links lead to. */
export type WithSite<Props> = Props & { site: string }

/** What a template file gives: how it is headed, how it is drawn, and props to look at it with. */
export interface MailKind<Props> {
  subject: (props: Props) => string
  Body: (props: WithSite<Props>) => ReactElement
  samples: readonly Props[]
}
