import { armCase } from './arm-case'
import type { Figures } from './figures'
import type { Inputs } from './inputs'
import { levelCase } from './level-case'
import { lineOutputCase } from './line-output-case'
import { loadingCase } from './loading-case'
import { noiseCase } from './noise-case'
import { overloadCase } from './overload-case'
import { stepUpCase } from './step-up-case'
import { velocityCase } from './velocity-case'

/** One line a kind of case: from its inputs to the figures that the product itself computes. */
export const CASE_KINDS: Readonly<Record<string, (inputs: Inputs) => Figures>> = {
  mm_loading: loadingCase,
  mc_loading: loadingCase,
  step_up: stepUpCase,
  noise: noiseCase,
  velocity: velocityCase,
  level_chain: levelCase,
  overload: overloadCase,
  arm_resonance: armCase,
  line_output: lineOutputCase,
}
