import type { Control, Filter, Group } from '../match/controls'
import type { GainOption, InputPath, Preamp } from '../match/preamp'
import { scaled, type Quantity } from '../match/quantity'
import type { Figure } from './schema'
import type { BoardEntry, GainEntry, GroupEntry, PathEntry, PreampEntry } from './schema-preamp'

/** Catalogue data in edge units to a preamp of the engine in SI. Pure; runs in the browser as well. */

const MILLI = 1e-3
const MICRO = 1e-6
const NANO = 1e-9
const PICO = 1e-12
const KILO = 1e3

/** A catalogue figure times the size of its unit. */
export function toQuantity({ printed, ...figure }: Figure, unit = 1): Quantity {
  return scaled(printed === undefined ? figure : { ...figure, printed }, unit)
}

function toGroup(group: GroupEntry): Group {
  const { sets, how } = group
  if (sets === 'load' && how === 'choice') {
    const options = Object.entries(group.options).map(([key, { loadOhms }]) => [key, { loadOhms: toQuantity(loadOhms) }])
    return { ...group, options: Object.fromEntries(options) as Record<string, { loadOhms: Quantity }> }
  }
  if (sets === 'load') return { ...group, resistorsOhms: group.resistorsOhms.map((ohms) => toQuantity(ohms)) }
  if (sets === 'capacitance') {
    const { capacitorsPicofarads, ...rest } = group
    return { ...rest, capacitorsFarads: capacitorsPicofarads.map((picofarads) => toQuantity(picofarads, PICO)) }
  }
  return group
}

function toPath({ id, label, loadKilohms, inputPicofarads, stepUp }: PathEntry): InputPath {
  return {
    id,
    label,
    loadOhms: toQuantity(loadKilohms, KILO),
    inputFarads: toQuantity(inputPicofarads, PICO),
    stepUp: stepUp && {
      name: stepUp.name,
      ratio: toQuantity(stepUp.ratio),
      primaryOhms: toQuantity(stepUp.primaryOhms),
      secondaryOhms: toQuantity(stepUp.secondaryOhms),
      primaryHenries: stepUp.primaryHenries && toQuantity(stepUp.primaryHenries),
      secondaryFarads: toQuantity(stepUp.secondaryPicofarads, PICO),
    },
  }
}

/**
 * The engine reckons gain and limit from the amplifier's own input, behind a built-in transformer; manuals print them
 * from the sockets. The transformer's own doubt is in its ratio and is not counted twice.
 */
function toGain(gain: GainEntry, paths: PathEntry[]): GainOption {
  const ratio = paths.find(({ id }) => id === gain.pathId)?.stepUp?.ratio.nominal ?? 1
  const transformerDecibels = 20 * Math.log10(ratio)
  const decibels = toQuantity(gain.gainDecibels)
  return {
    id: gain.id,
    pathId: gain.pathId,
    gainDecibels: {
      ...decibels,
      low: decibels.low - transformerDecibels,
      nominal: decibels.nominal - transformerDecibels,
      high: decibels.high - transformerDecibels,
    },
    overload: gain.overload.map(({ hertz, millivolts }) => ({ hertz, volts: millivolts.nominal * MILLI * ratio })),
    voltageNoise: toQuantity(gain.voltageNoiseNanovoltsPerRootHertz, NANO),
    currentNoise: toQuantity(gain.currentNoisePicoamperesPerRootHertz, PICO),
  }
}

/** The least a cartridge can be loaded with on this board, as its coil sees it: every switch ON, or the lowest plug. */
export function lowestLoadOhms(board: BoardEntry): number {
  const loads = board.paths.flatMap((path) => {
    const base = path.loadKilohms.nominal * KILO
    const seen = board.groups.flatMap((group) => {
      if (group.sets !== 'load') return []
      if (group.how === 'choice') return Object.values(group.options).map(({ loadOhms }) => loadOhms.nominal)
      // The smallest alone, not all together: some exclude each other, and no maker prints the sum.
      return group.resistorsOhms.map(({ nominal }) => 1 / (1 / base + 1 / nominal))
    })
    const atSecondary = [base, ...seen]
    if (!path.stepUp) return atSecondary
    const { ratio, primaryOhms, secondaryOhms } = path.stepUp
    return atSecondary.map((ohms) => primaryOhms.nominal + (secondaryOhms.nominal + ohms) / ratio.nominal ** 2)
  })
  return Math.min(...loads)
}

/** One board of one model, ready to be checked. */
export function toPreamp(entry: PreampEntry, board: BoardEntry): Preamp {
  return {
    modelId: entry.id,
    modelName: entry.name,
    boardId: board.id,
    boardName: board.name,
    technology: entry.technology,
    inputMode: entry.inputMode,
    topology: board.topology,
    controls: board.controls satisfies Control[],
    groups: board.groups.map(toGroup),
    exclusions: board.exclusions,
    asDelivered: board.asDelivered,
    paths: board.paths.map(toPath),
    gains: board.gains.map((gain) => toGain(gain, board.paths)),
    maximumOutputVolts: toQuantity(board.maximumOutputVolts),
    outputOhms: toQuantity(board.outputOhms),
    couplingFarads: board.couplingMicrofarads && toQuantity(board.couplingMicrofarads, MICRO),
    hasBalancedOutput: board.hasBalancedOutput,
    fixedFilter: board.fixedFilter satisfies Filter | null,
    iecBass: board.iecBass,
    offers: {
      stepUpInput: board.paths.some(({ id, stepUp }) => id === 'mm' && !stepUp),
      lowestLoadOhms: lowestLoadOhms(board),
    },
  }
}
