// @vitest-environment jsdom
import { fireEvent, render, screen } from '@testing-library/react'
import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, test, vi } from 'vitest'
import { PanelPicker } from '@/components/panel/panel-picker'
import { readPositionFields } from '@/lib/match/state-fields'
import { encodeState } from '@/lib/match/states'
import { CATALOGUE_PREAMPS, cataloguePreamp } from '../../support/catalogue-preamps'

const tarn = cataloguePreamp('tarn-2', 'second')
const merrin = cataloguePreamp('merrin-5', 'only')
const ember = cataloguePreamp('ember-3', 'only')

const hidden = (container: HTMLElement, name: string) => container.querySelector<HTMLInputElement>(`input[type=hidden][name=${name}]`)?.value

describe('telling how a unit stands', () => {
  test('both sides alike: one bank, both texts', () => {
    const onChange = vi.fn()
    const { container } = render(<PanelPicker preamp={tarn} legend="How yours stand now" onChange={onChange} />)
    fireEvent.click(screen.getAllByRole('checkbox', { name: 'Switch 7, capacitance' })[0])
    expect(onChange).toHaveBeenLastCalledWith({ left: 'bank.00000010', right: 'bank.00000010' })
    expect([hidden(container, 'left'), hidden(container, 'right')]).toEqual(['bank.00000010', 'bank.00000010'])
    expect(container.textContent).toContain('That is: Gain 36 dB, Load 47 kΩ, Capacitance 270 pF, Rumble Off.')
  })

  test('each side by itself, and back to alike takes the left one for both', () => {
    const { container } = render(<PanelPicker preamp={tarn} legend="How yours stand now" value={{ left: 'bank.10000000', right: 'bank.00000001' }} />)
    expect(screen.getByRole<HTMLInputElement>('radio', { name: 'Each side by itself' }).checked).toBe(true)
    fireEvent.click(screen.getAllByRole('checkbox', { name: 'Switch 2, gain' })[1])
    expect([hidden(container, 'left'), hidden(container, 'right')]).toEqual(['bank.10000000', 'bank.01000001'])
    fireEvent.click(screen.getByRole('radio', { name: 'Both sides alike' }))
    expect([hidden(container, 'left'), hidden(container, 'right')]).toEqual(['bank.10000000', 'bank.10000000'])
  })

  test('a pair that excludes each other is refused with the way out', () => {
    const { container } = render(<PanelPicker preamp={tarn} legend="How yours stand now" value={{ left: 'bank.00100000', right: 'bank.00100000' }} />)
    fireEvent.click(screen.getAllByRole('checkbox', { name: 'Switch 4, load' })[0])
    expect(screen.getByRole('alert').textContent).toBe('Switches 3 and 4 cannot both be ON. Turn 3 off first.')
    expect(hidden(container, 'left')).toBe('bank.00100000')
    fireEvent.click(screen.getAllByRole('checkbox', { name: 'Switch 3, load' })[0])
    expect(screen.queryByRole('alert')).toBeNull()
    expect(hidden(container, 'left')).toBe('bank.00000000')
  })

  test('plugs by side, a slide for both', () => {
    const { container } = render(<PanelPicker preamp={merrin} legend="How yours stand now" value={{ left: 'plugs.30_slide.64', right: 'plugs.100_slide.64' }} />)
    fireEvent.click(screen.getByRole('radio', { name: '56' }))
    expect([hidden(container, 'left'), hidden(container, 'right')]).toEqual(['plugs.30_slide.56', 'plugs.100_slide.56'])
  })

  test('front buttons have no sides', () => {
    const { container } = render(<PanelPicker preamp={ember} legend="How yours stand now" />)
    expect(screen.queryByText('Both sides alike')).toBeNull()
    fireEvent.click(screen.getByRole('radio', { name: 'MC' }))
    fireEvent.click(screen.getByRole('checkbox', { name: 'Rumble' }))
    expect(hidden(container, 'left')).toBe('input.mc_mc-load.100_rumble.1_mono.0')
  })

  test('what does not fit this board counts as delivered', () => {
    const { container } = render(<PanelPicker preamp={tarn} legend="How yours stand now" value={{ left: 'plugs.30', right: '' }} />)
    expect(hidden(container, 'left')).toBe('bank.00000000')
  })

  test('without script the fields alone tell the same', () => {
    for (const preamp of CATALOGUE_PREAMPS) {
      const page = document.createElement('form')
      page.innerHTML = renderToStaticMarkup(<PanelPicker preamp={preamp} legend="How yours stand now" />)
      expect(page.innerHTML).not.toContain('style=')
      const sent = new FormData(page)
      const read = readPositionFields(preamp, (name) => sent.getAll(name).map(String))
      expect(read).toEqual({ left: preamp.asDelivered, right: preamp.asDelivered })
      expect(sent.get('left')).toBe(encodeState(preamp, preamp.asDelivered))
    }
  })
})
