// @vitest-environment jsdom
import { fireEvent, render, screen, within } from '@testing-library/react'
import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, test, vi } from 'vitest'
import type { ControlState, Positions, Preamp } from '@/lib/match'
import { MiniPanel } from '@/components/panel/mini-panel'
import { PanelDrawing, type PanelDrawingProps } from '@/components/panel/panel-drawing'
import { CATALOGUE_PREAMPS, cataloguePreamp } from '../../support/catalogue-preamps'
import { PREAMPS, mixedPreamp } from '../../support/preamps'

const alike = (state: ControlState): Positions => ({ left: state, right: state })
const bank = (bits: string): ControlState => ({ bank: bits })
const tarn = cataloguePreamp('tarn-2', 'second')
const merrin = cataloguePreamp('merrin-5', 'only')
const ember = cataloguePreamp('ember-3', 'only')

function drawn(props: PanelDrawingProps): SVGElement {
  const svg = render(<PanelDrawing {...props} />).container.querySelector('svg')
  if (!svg) throw new Error('Nothing was drawn.')
  return svg
}

const count = (svg: Element, selector: string) => svg.querySelectorAll(selector).length
const texts = (svg: Element, selector: string) => [...svg.querySelectorAll(selector)].map((one) => one.textContent)
const WIDTHS = [284, 354, 440, 560, 590, 720, 899, 900, 928, 1100]

describe('every panel', () => {
  const both: Preamp[] = [...CATALOGUE_PREAMPS, ...PREAMPS]

  test('is drawn at any width without inline styles, as one picture with its words', () => {
    for (const preamp of both) {
      for (const width of WIDTHS) {
        const markup = renderToStaticMarkup(<PanelDrawing preamp={preamp} present={null} target={preamp.asDelivered} width={width} />)
        expect(markup).not.toMatch(/style=|NaN|undefined/)
        expect(markup).toContain('role="img"')
        expect(markup).toContain(`panel of the ${preamp.modelName}.`)
        expect(markup).toContain(`width="${width}"`)
      }
    }
  })

  test('shows what stands under every bracket', () => {
    const svg = drawn({ preamp: tarn, present: alike(bank('10000010')), target: null, width: 928 })
    expect(texts(svg, '.gl')).toEqual(['Gain', 'Load', 'Capacitance', 'Rumble', 'Gain', 'Load', 'Capacitance', 'Rumble'])
    expect(texts(svg, '.gv').slice(0, 4)).toEqual(['42 dB', '47 kΩ', '270 pF', 'Off'])
  })

  test('follows the board that the serial decides', () => {
    const svg = drawn({ preamp: cataloguePreamp('tarn-2', 'first'), present: null, target: bank('00000000'), width: 928 })
    expect(texts(svg, '.gl').slice(0, 4)).toEqual(['Load', 'Gain', 'Capacitance', 'Rumble'])
  })

  test('names switches for what they do with the input in use', () => {
    const gains = (input: string) => texts(drawn({ preamp: mixedPreamp(), present: null, target: { six: '000000', input }, width: 1000 }), '.gl').slice(0, 3)
    expect(gains('mm')).toEqual(['MM gain', 'MC load', 'Capacitance'])
    expect(gains('mc')).toEqual(['MC gain', 'MC load', 'Capacitance'])
  })

  test('has at least 24 by 24 to press, wherever eight switches fit', () => {
    for (const preamp of both) {
      for (const width of WIDTHS) {
        const markup = renderToStaticMarkup(
          <PanelDrawing preamp={preamp} present={null} target={preamp.asDelivered} width={width} onFlip={() => undefined} />,
        )
        const sizes = [...markup.matchAll(/class="hit"[^>]* width="([\d.]+)" height="([\d.]+)"/g)]
        expect(sizes.length > 0).toBe(preamp.controls.length > 0)
        expect(Math.min(24, ...sizes.flatMap(([, wide, high]) => [Number(wide), Number(high)]))).toBe(24)
      }
    }
  })
})

describe('moves', () => {
  test('mark the slot, the place where the tab was, and the way', () => {
    const svg = drawn({ preamp: tarn, present: alike(bank('10000010')), target: bank('00000000'), width: 928 })
    expect([count(svg, '.slot.chg'), count(svg, '.was'), count(svg, '.mv')]).toEqual([4, 4, 4])
    expect(texts(svg, '.swn.c')).toEqual(['1', '7', '1', '7'])
    expect(svg.getAttribute('aria-label')).toBe(
      'Back panel of the Tarn 2. Switch 1 to OFF. Switch 7 to OFF. Then: All switches OFF. Gain 36 dB, load 47 kΩ, capacitance 70 pF, rumble off.',
    )
  })

  test('are not marked when nobody knows how it stands, nor while something is tried out', () => {
    const unknown = drawn({ preamp: tarn, present: null, target: bank('00000000'), width: 928 })
    expect(count(unknown, '.slot.chg, .was, .mv')).toBe(0)
    expect(unknown.getAttribute('aria-label')).toContain('All eight OFF, both sides.')
    const trying = drawn({ preamp: tarn, present: alike(bank('10000010')), target: bank('00000000'), trying: bank('10000000'), width: 928 })
    expect(count(trying, '.slot.chg, .was, .mv')).toBe(0)
    expect(texts(trying, '.gv')[0]).toBe('42 dB')
  })

  test('of one side stand on that side only', () => {
    const svg = drawn({ preamp: tarn, present: { left: bank('10000000'), right: bank('00000100') }, target: bank('00000000'), width: 928 })
    expect(texts(svg, '.swn.c')).toEqual(['1', '6'])
  })

  test('of a load plug say what goes in, what comes out and where it is', () => {
    const svg = drawn({ preamp: merrin, present: alike({ plugs: '1k', slide: '72' }), target: { plugs: '100', slide: '64' }, width: 928 })
    expect(texts(svg, '.gv.in')).toEqual(['100 Ω', '100 Ω', '100 Ω'])
    expect(texts(svg, '.gv.out')).toEqual(['1 kΩ', '1 kΩ'])
    expect(texts(svg, '.pl')).toContain('IN THE BOX')
    expect(texts(svg, '.pl')).toContain('GAIN, dB')
    expect(texts(svg, '.swn.c')).toEqual(['64'])
  })

  test('of buttons show those that come out by themselves', () => {
    const present = alike({ input: 'mm', 'mc-load': '100', rumble: '0', mono: '0' })
    const svg = drawn({ preamp: ember, present, target: { input: 'mc', 'mc-load': '400', rumble: '1', mono: '0' }, width: 928 })
    expect(texts(svg, '.swn.c')).toEqual(['MM', 'MC', '100 Ω', '400 Ω', 'Rumble'])
    expect(count(svg, '.slot.chg')).toBe(3)
    expect(count(svg, '.was')).toBe(2)
    expect(texts(svg, '.onoff')).toEqual(['out', 'in', 'out', 'out', 'in', 'in', 'out'])
  })

  test('another setting is compared by a thick edge', () => {
    const svg = drawn({ preamp: tarn, present: null, target: bank('00000000'), comparedWith: bank('10000000'), width: 440 })
    expect(svg.classList.contains('cmp')).toBe(true)
    expect(count(svg, '.slot.chg')).toBe(1)
  })
})

describe('the form follows the width', () => {
  const banks = (props: Partial<PanelDrawingProps>) =>
    count(drawn({ preamp: tarn, present: alike(bank('00000000')), target: bank('00000000'), width: 354, ...props }), '.body')

  test('a phone has one bank where both sides are alike, two where they are not', () => {
    expect(banks({})).toBe(1)
    expect(banks({ present: { left: bank('10000000'), right: bank('00000000') } })).toBe(2)
    expect(banks({ width: 559 })).toBe(1)
    expect(banks({ width: 560 })).toBe(2)
  })

  test('sockets stand on wide drawings, and parts alone can be asked for', () => {
    const sockets = (props: Partial<PanelDrawingProps>) => texts(drawn({ preamp: tarn, present: null, target: bank('00000000'), width: 928, ...props }), '.pl')
    expect(sockets({})).toContain('OUT')
    expect(sockets({ width: 899 })).not.toContain('OUT')
    expect(sockets({ compact: true })).toEqual(['Left', 'Right, set the same'])
  })

  test('print has its own width and nothing to press', () => {
    const svg = drawn({ preamp: tarn, present: null, target: bank('00000000'), width: 354, print: true, onFlip: () => undefined })
    expect(svg.getAttribute('width')).toBe('590')
    expect(count(svg, '.flip')).toBe(0)
  })

  test('a preamp without controls says what is fixed', () => {
    const svg = drawn({ preamp: cataloguePreamp('sedge-1', 'only'), present: null, target: {}, width: 928 })
    expect(svg.textContent).toContain('Nothing to set')
    expect(svg.textContent).toContain('47 kΩ, 100 pF and 40 dB are fixed')
  })

  test('a group in focus is outlined on both sides', () => {
    expect(count(drawn({ preamp: tarn, present: null, target: bank('00000000'), width: 584, focusGroup: 'capacitance' }), '.ring.on')).toBe(2)
  })
})

describe('trying out by hand', () => {
  test('every switch is named once, tells how it stands and answers to pointer and keys', () => {
    const onFlip = vi.fn()
    render(<PanelDrawing preamp={tarn} present={null} target={bank('00000000')} trying={bank('00100000')} width={928} onFlip={onFlip} />)
    const switches = screen.getAllByRole('switch')
    expect(switches).toHaveLength(8)
    expect(switches.map((one) => one.getAttribute('aria-checked'))).toEqual(['false', 'false', 'true', 'false', 'false', 'false', 'false', 'false'])
    const third = screen.getByRole('switch', { name: 'Switch 3, load, both sides' })
    fireEvent.click(third)
    fireEvent.keyDown(third, { key: ' ' })
    fireEvent.keyDown(third, { key: 'Enter' })
    expect(onFlip.mock.calls).toEqual([[{ control: 'bank', to: 3 }], [{ control: 'bank', to: 3 }], [{ control: 'bank', to: 3 }]])
  })

  test('the right bank answers to the pointer and is not told twice', () => {
    const onFlip = vi.fn()
    const svg = drawn({ preamp: tarn, present: null, target: bank('00000000'), width: 928, onFlip })
    const doubles = svg.querySelectorAll('.flip[aria-hidden="true"]')
    expect(doubles).toHaveLength(8)
    expect([...doubles].every((one) => !one.hasAttribute('tabindex'))).toBe(true)
    fireEvent.click(doubles[7])
    expect(onFlip).toHaveBeenCalledWith({ control: 'bank', to: 8 })
  })

  test('arrow keys go along the bank, round its ends', () => {
    render(<PanelDrawing preamp={tarn} present={null} target={bank('00000000')} width={928} onFlip={() => undefined} />)
    const [first, second, ...rest] = screen.getAllByRole('switch')
    first.focus()
    fireEvent.keyDown(first, { key: 'ArrowRight' })
    expect(document.activeElement).toBe(second)
    fireEvent.keyDown(second, { key: 'ArrowLeft' })
    fireEvent.keyDown(first, { key: 'ArrowLeft' })
    expect(document.activeElement).toBe(rest.at(-1))
  })

  test('plugs, places and buttons that let each other out are choices; arrows choose', () => {
    const onFlip = vi.fn()
    render(<PanelDrawing preamp={merrin} present={null} target={{ plugs: '100', slide: '64' }} width={354} onFlip={onFlip} />)
    const plugs = within(screen.getByRole('radiogroup', { name: 'Load plugs, both sides' }))
    expect(plugs.getAllByRole('radio').map((one) => one.getAttribute('tabindex'))).toEqual(['-1', '-1', '0', '-1', '-1'])
    fireEvent.keyDown(plugs.getByRole('radio', { name: '100 Ω plug, both sides' }), { key: 'ArrowLeft' })
    expect(onFlip).toHaveBeenLastCalledWith({ control: 'plugs', to: '30' })
    fireEvent.click(screen.getByRole('radio', { name: 'Gain, 72 dB' }))
    expect(onFlip).toHaveBeenLastCalledWith({ control: 'slide', to: '72' })
  })

  test('buttons that stand by themselves are switches', () => {
    render(<PanelDrawing preamp={ember} present={null} target={ember.asDelivered} width={928} onFlip={() => undefined} />)
    expect(screen.getAllByRole('switch').map((one) => one.getAttribute('aria-label'))).toEqual(['Filter, Rumble', 'Output, Mono'])
    expect(screen.getAllByRole('radio')).toHaveLength(5)
  })
})

test('the small panel tells models apart and is silent', () => {
  const small = CATALOGUE_PREAMPS.map((preamp) => renderToStaticMarkup(<MiniPanel preamp={preamp} />))
  expect(new Set(small).size).toBe(4)
  for (const markup of small) {
    expect(markup).toContain('aria-hidden="true"')
    expect(markup).not.toMatch(/style=|NaN/)
  }
})
