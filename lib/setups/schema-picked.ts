import type { ComplianceField, Figure, LeafletField, OutputField } from '../catalogue/schema'
import type { ArmView, CartridgeView, InputView, LeadView, StepUpView } from '../catalogue/views'
import { typicalCartridge } from '../match/typical'
import { choiceOf } from './answers'
import type { RawAnswers } from './trouble'
import { withMarks } from './leaflet'
import { figureAnswers, leafletAnswers, type Filled } from './picked-values'
import type { ComplianceCondition, Meaning, NumberField, ValueField } from './terms'

/**
 * What choosing an entry of the catalogue answers. Values come as the leaflet prints them and are marked as such;
 * what the leaflet does not say is emptied, so that nothing of another thing stays behind.
 */

const CLEARED = (field: ValueField): RawAnswers => ({ [field]: '', [`${field}To`]: '', [`${field}How`]: 'unknown' })

function filled(answers: RawAnswers, names: RawAnswers, values: Partial<Record<ValueField, Filled | null>>): RawAnswers {
  const fields = Object.keys(values) as ValueField[]
  const said = fields.filter((field) => values[field])
  const written = Object.assign({}, ...fields.map((field) => ({ ...CLEARED(field), ...values[field] }))) as RawAnswers
  return withMarks({ ...answers, ...names, ...written }, said, fields)
}

const MEASURED: Record<ComplianceField['measured'], ComplianceCondition> = {
  dynamic10Hz: '10-hz',
  dynamic100Hz: '100-hz',
  static: 'static',
  unknown: 'not-said',
}

function meaningOf({ velocity }: OutputField): Meaning {
  if (velocity.form !== 'atVelocity') return 'not-said'
  const { kind } = velocity
  // Few leaflets name the up-and-down direction, and no choice here stands for it.
  const direction = velocity.direction === 'vertical' ? null : velocity.direction
  if (kind && direction) return `${kind}-${direction === 'lateral' ? 'lateral' : 'channel'}`
  if (kind) return kind
  if (direction) return direction === 'lateral' ? 'lateral' : 'channel'
  return 'not-said'
}

function velocityAnswers({ velocity }: OutputField): RawAnswers {
  if (velocity.form === 'perVelocity') return { velocity: 'per-cm', velocityOther: '' }
  if (velocity.form === 'none') return { velocity: 'none', velocityOther: '' }
  const speed = String(velocity.centimetresPerSecond)
  return speed === '5' || speed === '3.54' ? { velocity: speed, velocityOther: '' } : { velocity: 'other', velocityOther: speed }
}

/** Fills the leaflet of a cartridge into answers already given. */
export function answersFromCartridge(view: CartridgeView, answers: RawAnswers = {}): RawAnswers {
  const magnetic = view.type === 'moving-magnet' || view.type === 'moving-iron' || view.type === 'moving-coil'
  const names: RawAnswers = {
    name: view.name,
    cart: view.id,
    type: magnetic ? view.type : 'other',
    other: magnetic ? '' : view.type,
    mono: view.channels === 'mono' ? 'yes' : 'no',
    velocity: '',
    velocityOther: '',
    meaning: '',
    complianceAt: view.complianceMicrometresPerMillinewton ? MEASURED[view.complianceMicrometresPerMillinewton.measured] : '',
  }
  if (view.outputMillivolts) {
    Object.assign(names, velocityAnswers(view.outputMillivolts), { meaning: meaningOf(view.outputMillivolts) })
  }
  const type = choiceOf(names)
  const usual = typicalCartridge(magnetic ? view.type : 'unknown')
  const value = (field: Exclude<ValueField, 'ratio'>, leaflet: LeafletField | null, ends = { low: 0, high: Infinity }) =>
    magnetic ? leafletAnswers(field, leaflet, { type, ends }) : null
  // Printed for the preamp alone it is not the total that a check compares, and the rest is not known here.
  const capacitance = view.loadPicofarads?.means === 'preamp-only' ? null : view.loadPicofarads
  return filled(answers, names, {
    output: value('output', view.outputMillivolts, inUnit(usual.outputVolts, 1e-3)),
    coil: value('coil', view.coilOhms, usual.coilOhms),
    inductance: value('inductance', view.inductanceMillihenries, inUnit(usual.coilHenries, 1e-3)),
    load: value('load', view.loadOhms),
    capacitance: value('capacitance', capacitance),
    mass: value('mass', view.massGrams, inUnit(usual.massKilograms, 1e-3)),
    compliance: value('compliance', view.complianceMicrometresPerMillinewton, inUnit(usual.complianceMetresPerNewton, 1e-3)),
    force: value('force', view.trackingForceGrams, { low: 0.5, high: 5 }),
  })
}

const inUnit = ({ low, high }: { low: number; high: number }, size: number) => ({ low: low / size, high: high / size })

const figure = (field: ValueField, of: Figure | null) => of && figureAnswers(field, of)

export function answersFromArm(view: ArmView, answers: RawAnswers = {}): RawAnswers {
  const own = view.fixedLead
  const ownLead: RawAnswers = own
    ? {
        leadName: `Lead of the ${view.name}`,
        leadId: '',
        leadAs: own.picofarads ? 'whole' : 'metres',
        lead: own.picofarads ? (figureAnswers('lead', own.picofarads).lead ?? '') : '',
        leadMetres: String(own.lengthMetres),
        leadPerMetre: '',
      }
    : {}
  const withArm = filled(answers, { arm: view.name, armId: view.id, ...ownLead }, {
    armMass: figure('armMass', view.effectiveMassGrams),
    armWiring: figure('armWiring', view.wiringPicofarads),
  })
  return own ? withMarks(withArm, own.picofarads ? ['lead'] : ['leadMetres'], ['lead', 'leadMetres', 'leadPerMetre']) : withArm
}

export function answersFromStepUp(view: StepUpView, tap: StepUpView['taps'][number], answers: RawAnswers = {}): RawAnswers {
  const name = view.taps.length > 1 ? `${view.name}, at ${tap.label}` : view.name
  return filled(answers, { stepUp: 'yes', stepUpName: name, stepUpId: view.id }, {
    ratio: figure('ratio', tap.ratio),
    primaryCoil: figure('primaryCoil', tap.primaryOhms),
    secondaryCoil: figure('secondaryCoil', tap.secondaryOhms),
    primaryInductance: figure('primaryInductance', tap.primaryHenries),
  })
}

/** An arm lead of one of its lengths. Where no capacitance is printed only the length is filled in. */
export function answersFromLead(view: LeadView, length: LeadView['lengths'][number], answers: RawAnswers = {}): RawAnswers {
  const perMetre = view.picofaradsPerMetre
  const whole = !perMetre && length.picofarads
  const values: RawAnswers = {
    leadName: `${view.name}, ${length.metres} m`,
    leadId: view.id,
    leadAs: whole ? 'whole' : 'metres',
    lead: whole ? figureAnswers('lead', whole).lead : '',
    leadMetres: String(length.metres),
    leadPerMetre: perMetre ? figureAnswers('leadPerMetre', perMetre).leadPerMetre : '',
  }
  const said: NumberField[] = whole ? ['lead'] : perMetre ? ['leadMetres', 'leadPerMetre'] : ['leadMetres']
  return withMarks({ ...answers, ...values }, said, ['lead', 'leadMetres', 'leadPerMetre'])
}

export function answersFromInput(view: InputView, answers: RawAnswers = {}): RawAnswers {
  return filled(answers, { next: view.kind, nextName: view.name, nextId: view.id }, {
    nextMax: figure('nextMax', view.maximumVolts),
    nextLoad: figure('nextLoad', view.inputKilohms),
  })
}
