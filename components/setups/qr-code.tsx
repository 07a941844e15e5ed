import QRCode from 'qrcode'

/** Modules of empty ground that a reader needs on every side (ISO/IEC 18004). */
const QUIET = 4

/** One path for all dark modules, runs of a row in one stroke. */
function darkPath({ size, data }: { size: number; data: Uint8Array }): string {
  let path = ''
  for (let y = 0; y < size; y++) {
    for (let x = 0; x < size; x++) {
      if (!data[y * size + x]) continue
      const start = x
      while (x + 1 < size && data[y * size + x + 1]) x++
      path += `M${start + QUIET} ${y + QUIET}h${x - start + 1}v1h-${x - start + 1}z`
    }
  }
  return path
}

/** An address as a square to point a phone at: dark on white in every theme, since readers expect that. */
export function QrCode({ text, size, label }: { text: string; size: number; label: string }) {
  const { modules } = QRCode.create(text, { errorCorrectionLevel: 'M' })
  const edge = modules.size + 2 * QUIET
  return (
    <svg className="qr" role="img" aria-label={label} viewBox={`0 0 ${edge} ${edge}`} width={size} height={size} shapeRendering="crispEdges">
      <path fill="#ffffff" d={`M0 0h${edge}v${edge}H0z`} />
      <path fill="#000000" d={darkPath(modules)} />
    </svg>
  )
}
