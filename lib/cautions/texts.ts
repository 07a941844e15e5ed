/**
 * The fixed words for work that can hurt someone. Written here once and inserted by name, whole: never retyped,
 * shortened or split, on any page, paper or mail. A person translates them, per language.
 */

/** How to go down before the act, how to come back up after it, and why. */
export interface ActCaution {
  title: string
  before: string
  after: string
  why: string
}

/** What is never to be done, said flat. `instead` is the link to what to do. */
export interface EarthCaution {
  title: string
  never: string
  also: string
  instead: string
}

const BEFORE =
  'Stylus up, guard on. Volume right down. Amplifier off first, and wait half a minute; a valve amplifier, two. Then a valve preamp off too.'
const AFTER = 'Preamp on and settled, amplifier on last, volume up slowly.'

export const ACT_CAUTIONS = {
  /** Moving any plug: in or out of the preamp, its cable, the amplifier. */
  plug: {
    title: 'Caution: amplifier off before you move a plug',
    before: BEFORE,
    after: AFTER,
    why: 'A plug moved with the amplifier on can send a pulse loud enough to hurt loudspeakers and ears.',
  },
  /** Moving a switch, slide or button on a preamp; valve preamps as well. */
  switch: {
    title: 'Caution: amplifier off before you move a switch',
    before: BEFORE,
    after: AFTER,
    why: 'A switch moved while it is on can be very loud.',
  },
  /** Changing a load plug. */
  load: {
    title: 'Caution: amplifier off before you pull a load plug',
    before: BEFORE,
    after: AFTER,
    why: 'Without its plug the input is open: it hums and thumps at full gain.',
  },
  /** Touching a valve that can be reached without a tool. */
  valve: {
    title: 'Caution: amplifier off first, and let the valves cool',
    before:
      'Stylus up, guard on. Volume right down. Amplifier off first, and wait half a minute; a valve amplifier, two. Then the preamp off, its plug out of the wall, and ten minutes to cool. Only a valve you can reach without a tool, only a type on its list.',
    after: 'Plug in, preamp on, a full minute to settle, amplifier on last, volume up slowly.',
    why: 'The glass burns, and there is high voltage under it after it is off.',
  },
  /** Touching the clips at the head-shell. */
  clip: {
    title: 'Caution: amplifier off before you touch the clips',
    before: `${BEFORE} Tweezers on the clip, not on the pin. No solder, and no meter on the coils.`,
    after: AFTER,
    why: 'A clip moved with the amplifier on hums at full level, and a pin breaks off easily.',
  },
} as const satisfies Record<string, ActCaution>

export type Act = keyof typeof ACT_CAUTIONS

/** Wherever hum, earth or ground is the subject. */
export const EARTH_CAUTION: EarthCaution = {
  title: 'Caution: mains earth',
  never: 'Never disconnect the mains earth. It can kill.',
  also: 'Do not add to it either: the ground post on the preamp is for screening, not for safety.',
  instead: 'What to do instead',
}

export interface StopText {
  /** What it is about, in a few words. */
  about: string
  title: string
  /** In this order: flames or a hurt person first. */
  acts: readonly string[]
}

export const STOP_TEXTS = {
  heat: {
    about: 'Smoke, smell, heat, liquid, second fuse',
    title: 'Stop. Do not test anything.',
    acts: [
      'If there are flames or thick smoke: leave, and call the emergency number where you are.',
      'If you can reach the wall plug safely, pull it out. If you cannot, keep away from it.',
      'Do not switch it on again. No other adapter, no other fuse. Do not open it.',
    ],
  },
  tingle: {
    about: 'Tingle or shock',
    title: 'Stop. Touch no metal on it.',
    acts: [
      'If someone had a shock and feels unwell: call the emergency number where you are.',
      'Let go, and touch no metal on the deck, the preamp, the amplifier or the leads.',
      'If you can reach the wall plug safely, pull it out by its plastic, with dry hands. If you cannot, keep away from it.',
      'Do not plug it in again. Do not change the earth, the adapter or the fuse. Do not open it.',
    ],
  },
  house: {
    about: 'House wiring',
    title: 'Stop. It may be the house wiring.',
    acts: [
      'If there are flames, smoke or sparks: leave, and call the emergency number where you are.',
      'Touch no metal on any of the devices. If you can reach the main switch safely, turn it off.',
      'Call an electrician. Wiring follows local rules, and we cannot judge it from here.',
      'Do not use another adapter, fuse or socket to get round it.',
    ],
  },
} as const satisfies Record<string, StopText>

export type StopKind = keyof typeof STOP_TEXTS

export const STOP_KINDS = Object.keys(STOP_TEXTS) as StopKind[]
