import type { NoiseLevels } from '../plots/noise-facts'
import type { Evaluation } from '@/lib/match/result'
import { decibels } from '@/lib/setups/format'

interface Props {
  evaluation: Evaluation
  levels: NoiseLevels
  temperatureKelvin: number
}

/** Powers add: what the coil makes of the whole, in tenths. */
function coilTenths({ yours, coil }: NoiseLevels): string {
  const share = 10 ** ((yours.nominal - coil) / 10)
  const tenths = Math.round(share * 10)
  if (tenths <= 0) return 'next to none of it'
  return tenths >= 10 ? 'nearly all of it' : `about ${tenths} tenths of it`
}

/** What the noise is made of, and how it was reckoned. */
export function NoiseDetails({ evaluation, levels, temperatureKelvin }: Props) {
  const { snrFlatDecibels } = evaluation.figures
  const { yours, groove, coil } = levels
  const rows: [string, string][] = [
    ['Noise of the groove', `${decibels(groove)} under 5 cm/s`],
    ['Preamp and cartridge, at worst', `${decibels(yours.low)} under 5 cm/s`],
    ['Preamp and cartridge, middle', `${decibels(yours.nominal)} under 5 cm/s`],
    ['The coil alone', `${decibels(coil)} under 5 cm/s`],
    ['What the coil makes of it', coilTenths(levels)],
    ['Without weighting, at worst', `${decibels(snrFlatDecibels.low)} under 5 cm/s`],
    ['Reckoned from', 'heat in the coil and its load, voltage and current noise of the input'],
    ['Band', '20 Hz to 20 kHz, after replay equalisation'],
    ['Weighting', 'A, set to 0 at 1 kHz'],
    ['Temperature', `${Math.round(temperatureKelvin - 273.15)} °C`],
  ]
  return (
    <details className="tbh no-p">
      <summary>What makes it up</summary>
      <table>
        <caption className="vh">What the noise is made of</caption>
        <tbody>
          {rows.map(([what, value]) => (
            <tr key={what}>
              <th scope="row">{what}</th>
              <td>{value}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  )
}
