import { Body, Column, Container, Head, Html, Link, Preview, Row } from '@react-email/components'
import type { ReactNode } from 'react'
import { MAKER } from '@/lib/maker/terms'
import { DARK_AND_NARROW, LIGHT } from './inks'
import { link, narrow, row, text } from './styles'

interface Props {
  /** What a list of mails shows after the subject. Never a move without its caution. */
  preview: string
  /** What the mail belongs to, at the right of the masthead. */
  about: string
  /** Why this person gets it, as the last sentence. */
  because: string
  /** Scheme, host and port of the site. */
  site: string
  children: ReactNode
}

/** The sheet that every mail is written on: 600 wide at most, tables throughout, nothing to fetch. */
export function Layout({ preview, about, because, site, children }: Props) {
  return (
    <Html lang="en-GB">
      <Head>
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <meta name="color-scheme" content="light dark" />
        <meta name="supported-color-schemes" content="light dark" />
        <style>{DARK_AND_NARROW}</style>
      </Head>
      <Body className="paper" style={{ margin: 0, padding: 0, backgroundColor: LIGHT.paper }}>
        <Preview>{preview}</Preview>
        <Container className="paper" bgcolor={LIGHT.paper} style={{ width: '100%', maxWidth: '600px', backgroundColor: LIGHT.paper }}>
          <Row className="edge" style={{ borderBottom: `2px solid ${LIGHT.ink}` }}>
            <Column className="pad ink" style={{ ...row(20, 12), ...narrow(26, 28) }}>
              {MAKER.name}
            </Column>
            <Column className="pad ink2" align="right" style={{ ...row(20, 12), ...text(14, 20, LIGHT.ink2) }}>
              {about}
            </Column>
          </Row>
          {children}
          <Row>
            <Column className="pad" style={row(26, 34)}>
              <Row className="rule" style={{ borderTop: `1px solid ${LIGHT.rule}` }}>
                <Column className="ink2" style={{ ...text(13, 20, LIGHT.ink2), paddingTop: '12px' }}>
                  {MAKER.fullName}. {because}{' '}
                  <Link className="act" href={`${site}/privacy`} style={link}>
                    What we keep
                  </Link>
                </Column>
              </Row>
            </Column>
          </Row>
        </Container>
      </Body>
    </Html>
  )
}
