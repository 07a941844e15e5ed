// @vitest-environment jsdom
import { render, screen } from '@testing-library/react'
import { expect, test } from 'vitest'
import { CautionBox } from '@/components/shell/caution-box'
import { StopCard } from '@/components/shell/stop-card'
import { ACT_CAUTIONS, EARTH_CAUTION, STOP_KINDS, STOP_TEXTS, type Act } from '@/lib/cautions/texts'

test.each(Object.keys(ACT_CAUTIONS) as Act[])('the caution for "%s" is shown whole, before comes before after', (act) => {
  render(<CautionBox act={act} />)
  const { title, before, after, why } = ACT_CAUTIONS[act]
  expect(screen.getByRole('note').textContent).toBe(`${title}Before${before}After${after}${why}`)
})

test('a docked caution stays in view, the text is the same', () => {
  render(<CautionBox act="switch" dock />)
  expect(screen.getByRole('note')).toHaveProperty('className', 'caut dock')
})

test('the earth caution is shown whole and leads to what to do instead', () => {
  render(<CautionBox act="earth" insteadPath="/somewhere" />)
  const { title, never, also, instead } = EARTH_CAUTION
  expect(screen.getByRole('note').textContent).toBe(`${title}${never} ${also} ${instead}`)
  expect(screen.getByRole('link', { name: instead }).getAttribute('href')).toBe('/somewhere')
})

test.each(STOP_KINDS)('the stop card for "%s" tells what to do in order, and offers nothing else', (kind) => {
  render(<StopCard kind={kind} />)
  expect(screen.getByRole('heading').textContent).toBe(STOP_TEXTS[kind].title)
  expect(screen.getAllByRole('listitem').map((item) => item.textContent)).toEqual(STOP_TEXTS[kind].acts)
  expect(screen.queryByRole('button')).toBeNull()
  expect(screen.queryByRole('link')).toBeNull()
})
