/** The three grounds. Their meaning is fixed: screen = anywhere in here, hatch = distortion, dots = noise. */
export const screenFill = (id: string) => `url(#${id}scr)`
export const hatchFill = (id: string) => `url(#${id}no)`
export const dotsFill = (id: string) => `url(#${id}fl)`
export const clipTo = (id: string) => `url(#${id}c)`

/** Pitch in pixels. On paper they are coarser, so that all three stay apart at 150 dpi and in grey. */
const SCREEN_PITCH = { screen: 4, paper: 6.4 }
const HATCH_PITCH = { screen: 6, paper: 7 }

/** Definitions for one drawing; `clip` is the frame that curves are held to. */
export function Patterns({
  id,
  print = false,
  clip,
}: {
  id: string
  print?: boolean
  clip?: { left: number; top: number; width: number; height: number }
}) {
  const medium = print ? 'paper' : 'screen'
  const pitch = SCREEN_PITCH[medium]
  const hatch = HATCH_PITCH[medium]
  return (
    <defs>
      <pattern id={`${id}scr`} width={pitch} height={pitch} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
        <rect width={7} height={7} className="p-tint" />
        <path d={`M0 ${print ? 3 : 0}H7`} className={print ? 'p-scr pr' : 'p-scr'} />
      </pattern>
      <pattern id={`${id}no`} width={hatch} height={hatch} patternUnits="userSpaceOnUse" patternTransform="rotate(-45)">
        <path d="M0 0H7" className="p-no" />
      </pattern>
      <pattern id={`${id}fl`} width={5} height={5} patternUnits="userSpaceOnUse">
        <circle cx={1.2} cy={1.2} r={0.75} className="p-dot" />
        <circle cx={3.7} cy={3.7} r={0.75} className="p-dot" />
      </pattern>
      {clip && (
        <clipPath id={`${id}c`}>
          <rect x={clip.left} y={clip.top} width={clip.width} height={clip.height} />
        </clipPath>
      )}
    </defs>
  )
}
