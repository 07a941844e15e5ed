import type { Frame } from './geometry'
import { px } from './geometry'
import { axisHertz, signed } from './numbers'

type Scale = (value: number) => number

/** 1 to 9 in each decade, decades heavier. */
function logTicks(from: number, to: number): { value: number; decade: boolean }[] {
  const ticks = []
  for (let power = Math.floor(Math.log10(from)); power <= Math.ceil(Math.log10(to)); power++) {
    for (let step = 1; step < 10; step++) {
      const value = step * 10 ** power
      if (value >= from * 0.999 && value <= to * 1.001) ticks.push({ value, decade: step === 1 })
    }
  }
  return ticks
}

/** Upright lines of a logarithmic frequency axis. */
export function FrequencyGrid({ frame, x, from, to }: { frame: Frame; x: Scale; from: number; to: number }) {
  const ticks = logTicks(from, to)
  const lines = (decade: boolean) =>
    ticks
      .filter((tick) => tick.decade === decade)
      .map((tick) => `M${px(x(tick.value))} ${frame.top}V${frame.bottom}`)
      .join('')
  return (
    <>
      <path className="g2" d={lines(false)} />
      <path className="g1" d={lines(true)} />
    </>
  )
}

/** Figures under a frequency axis; the outer two are turned inwards, so that they keep to the drawing. */
export function FrequencyLabels({
  frame,
  x,
  at,
  title,
}: {
  frame: Frame
  x: Scale
  at: readonly number[]
  title: boolean
}) {
  const anchor = (place: number) =>
    place - frame.left < 12 ? 'start' : frame.right - place < 12 ? 'end' : 'middle'
  return (
    <>
      {at.map((hertz) => (
        <text className="tk" key={hertz} textAnchor={anchor(x(hertz))} x={px(x(hertz))} y={frame.bottom + 18}>
          {axisHertz(hertz)}
        </text>
      ))}
      {title && (
        <text className="tk" textAnchor="middle" x={px(frame.left + frame.width / 2)} y={frame.bottom + 38}>
          Frequency, Hz
        </text>
      )}
    </>
  )
}

/** Level lines with their figures; 0 dB is in ink. `labelEvery` leaves figures out, never lines. */
export function DecibelGrid({
  frame,
  y,
  at,
  labelEvery = 1,
}: {
  frame: Frame
  y: Scale
  at: readonly number[]
  labelEvery?: number
}) {
  return (
    <>
      {at.map((decibels) => (
        <path className={decibels === 0 ? 'g0' : 'g2'} key={decibels} d={`M${frame.left} ${px(y(decibels))}H${frame.right}`} />
      ))}
      {at
        .filter((decibels) => decibels % labelEvery === 0)
        .map((decibels) => (
          <text className="tk" key={decibels} textAnchor="end" x={frame.left - 7} y={px(y(decibels) + 5)}>
            {signed(decibels)}
          </text>
        ))}
    </>
  )
}

export function DecibelUnit({ frame, y }: { frame: Frame; y: number }) {
  return (
    <text className="tk" textAnchor="end" x={frame.left - 7} y={y}>
      dB
    </text>
  )
}

/** Multiples of `step` from `low` to `high`. */
export function multiples(low: number, high: number, step: number): number[] {
  const first = Math.ceil(low / step)
  const count = Math.floor(high / step) - first + 1
  return Array.from({ length: Math.max(0, count) }, (_, i) => (first + i) * step || 0)
}
