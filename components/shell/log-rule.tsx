const LOWEST_HERTZ = 20
const HIGHEST_HERTZ = 20_000
const WIDTH = 1000

/** 1 to 9 of each decade from 20 Hz to 20 kHz, at their places on a log axis; decades and fives are longer. */
function ticks(): string {
  const decades = Math.log10(HIGHEST_HERTZ / LOWEST_HERTZ)
  const marks: string[] = []
  for (const decade of [10, 100, 1000, 10_000]) {
    for (let step = 1; step <= 9; step++) {
      const hertz = decade * step
      if (hertz < LOWEST_HERTZ || hertz > HIGHEST_HERTZ) continue
      const x = (WIDTH * Math.log10(hertz / LOWEST_HERTZ)) / decades
      const height = step === 1 ? 10 : step === 5 ? 7 : 4
      marks.push(`M${x.toFixed(1)} 0V${height}`)
    }
  }
  return marks.join('')
}

const TICKS = ticks()

/** The ornament under the masthead, once a page. */
export function LogRule() {
  return (
    <svg className="logr" viewBox={`0 0 ${WIDTH} 10`} preserveAspectRatio="none" aria-hidden="true">
      <path d={TICKS} stroke="currentColor" strokeWidth="1" vectorEffect="non-scaling-stroke" fill="none" />
    </svg>
  )
}
