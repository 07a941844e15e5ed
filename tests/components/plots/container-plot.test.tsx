// @vitest-environment jsdom
import { act } from '@testing-library/react'
import { hydrateRoot, type Root } from 'react-dom/client'
import { renderToString } from 'react-dom/server'
import { afterEach, beforeEach, expect, test, vi } from 'vitest'
import { FitPlot } from '@/components/plots/container-plot'

let clientWidth = 0
let resized: () => void = () => undefined
let root: Root | null = null

class StubObserver {
  constructor(callback: () => void) {
    resized = callback
  }
  observe() {}
  disconnect() {}
}

beforeEach(() => {
  vi.stubGlobal('IS_REACT_ACT_ENVIRONMENT', true)
  vi.stubGlobal('ResizeObserver', StubObserver)
  vi.spyOn(HTMLElement.prototype, 'clientWidth', 'get').mockImplementation(() => clientWidth)
})
afterEach(() => {
  act(() => root?.unmount())
  root = null
  document.body.replaceChildren()
  vi.unstubAllGlobals()
  vi.restoreAllMocks()
})

const noise = { groove: 58, yours: { low: 79, nominal: 80, high: 81 }, coil: 82 }
const quieter = { groove: 58, yours: { low: 85, nominal: 86, high: 87 }, coil: 88 }
const plot = (data: typeof noise) => <FitPlot kind="noise" plot={data} />

/** The page as the server sends it, then taken over by the browser. */
function arrive() {
  const box = document.createElement('div')
  box.innerHTML = renderToString(plot(noise))
  document.body.append(box)
  const widths = () => [...box.querySelectorAll('svg')].map((svg) => svg.getAttribute('width'))
  const sent = widths()
  act(() => {
    root = hydrateRoot(box, plot(noise))
  })
  return { box, sent, widths }
}

test('the server draws at two likely widths, and the browser once at the width there is, without a mismatch', () => {
  clientWidth = 700
  const { box, sent, widths } = arrive()
  expect(sent).toEqual(['928', '354'])
  expect(widths()).toEqual(['700'])
  expect(box.querySelector('.fit')?.hasAttribute('data-measured')).toBe(true)
})

test('it follows the box, and keeps its last drawing while the box is not shown', () => {
  clientWidth = 700
  const { widths } = arrive()
  clientWidth = 512
  act(() => resized())
  expect(widths()).toEqual(['512'])
  clientWidth = 0
  act(() => resized())
  expect(widths()).toEqual(['512'])
})

test('where less motion was asked for, a change of data is drawn at once', () => {
  clientWidth = 928
  vi.stubGlobal('matchMedia', () => ({ matches: true, addEventListener() {}, removeEventListener() {} }))
  const { box } = arrive()
  act(() => root?.render(plot(quieter)))
  expect(box.querySelector('svg')?.getAttribute('aria-label')).toContain('85 dB under usual music')
})

test('otherwise it eases over, and ends exactly at the new data', () => {
  clientWidth = 928
  const frames: FrameRequestCallback[] = []
  vi.stubGlobal('matchMedia', () => ({ matches: false, addEventListener() {}, removeEventListener() {} }))
  vi.stubGlobal('requestAnimationFrame', (callback: FrameRequestCallback) => frames.push(callback))
  vi.stubGlobal('cancelAnimationFrame', () => undefined)
  const { box } = arrive()
  const label = () => box.querySelector('svg')?.getAttribute('aria-label') ?? ''
  act(() => root?.render(plot(quieter)))
  const stepTo = (time: number) => act(() => frames.splice(0).forEach((callback) => callback(time)))
  stepTo(1000)
  expect(label()).toContain('79 dB under usual music')
  stepTo(1045)
  expect(label()).toContain('82 dB under usual music') // a quarter of the time, 1 − 0.75³ = 58 % of the way
  stepTo(1200)
  expect(label()).toContain('85 dB under usual music')
  expect(frames).toHaveLength(0)
})
