import { Button, Column, Heading, Link, Row } from '@react-email/components'
import type { ReactNode } from 'react'
import { LIGHT } from './inks'
import { button, link, narrow, row, text } from './styles'

/** What to do, or what happened, in one line. */
export function Head1({ children }: { children: ReactNode }) {
  return (
    <Row>
      <Column className="pad" style={row(26)}>
        <Heading as="h1" className="ink head" style={narrow(36, 38)}>
          {children}
        </Heading>
      </Column>
    </Row>
  )
}

export function Words({ children }: { children: ReactNode }) {
  return (
    <Row>
      <Column className="pad ink" style={{ ...row(14), ...text(17, 26) }}>
        {children}
      </Column>
    </Row>
  )
}

/** Second rank: who and when, how long a link works, what to do if it was not you. */
export function Note({ children }: { children: ReactNode }) {
  return (
    <Row>
      <Column className="pad ink2" style={{ ...row(8), ...text(15, 23, LIGHT.ink2) }}>
        {children}
      </Column>
    </Row>
  )
}

interface ActionProps {
  href: string
  children: string
}

/** The one thing to press. */
export function Action({ href, children }: ActionProps) {
  return (
    <Row>
      <Column className="pad" style={row(22)}>
        <Button className="button" href={href} style={button}>
          {children}
        </Button>
      </Column>
    </Row>
  )
}

/** The same link once more, to copy, for readers that press nothing. Plain text has it beside the words already. */
export function CopyLink({ href }: { href: string }) {
  return (
    <Row data-skip-in-text={true}>
      <Column className="pad ink2" style={{ ...row(16), ...text(15, 23, LIGHT.ink2), wordBreak: 'break-all' }}>
        Or copy this into your browser:
        <br />
        <Link className="act" href={href} style={link}>
          {href}
        </Link>
      </Column>
    </Row>
  )
}
