import { benchMatch } from './bench/match'

/** Speed, printed and never asserted: run it on a quiet machine. */
const parts: [string, () => void][] = [['A check of the largest demo preamp, five inputs not known', benchMatch]]

for (const [title, run] of parts) {
  console.log(title)
  run()
}
