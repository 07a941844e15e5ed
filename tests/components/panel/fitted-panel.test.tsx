// @vitest-environment jsdom
import { render } from '@testing-library/react'
import { renderToStaticMarkup } from 'react-dom/server'
import { afterEach, expect, test, vi } from 'vitest'
import { FittedPanel } from '@/components/panel/fitted-panel'
import { cataloguePreamp } from '../../support/catalogue-preamps'

const tarn = cataloguePreamp('tarn-2', 'second')
const panel = <FittedPanel preamp={tarn} present={null} target={tarn.asDelivered} />

afterEach(() => vi.restoreAllMocks())

test('the page arrives with a drawing for a desk and one for a phone', () => {
  const markup = renderToStaticMarkup(panel)
  expect([...markup.matchAll(/<svg[^>]* width="(\d+)"/g)].map(([, width]) => width)).toEqual(['928', '354'])
  expect(markup).not.toContain('style=')
})

test('once measured there is one, drawn for its box', () => {
  vi.spyOn(HTMLElement.prototype, 'clientWidth', 'get').mockReturnValue(612)
  const { container } = render(panel)
  expect([...container.querySelectorAll('svg')].map((svg) => svg.getAttribute('width'))).toEqual(['612'])
})
