import type { Actor, SignedIn } from './actor'

/** What a rule needs to know of a row. */
interface Account {
  id: string
}
interface Owned {
  ownerId: string | null
}
interface Person {
  id: string
}

const isPresent = (who: Actor): who is SignedIn => who.kind === 'person' && !who.disabled
/** Present, and past everything that has to be done first. */
const isFree = (who: Actor): who is SignedIn => isPresent(who) && !who.mustSetUpSecondFactor
const isStaff = (who: Actor) => isFree(who) && (who.role === 'staff' || who.role === 'admin')
const isAdmin = (who: Actor) => isFree(who) && who.role === 'admin'
const isSelf = (who: Actor, account: { id: string }) => isFree(who) && who.id === account.id
const owns = (who: Actor, row: Owned) => isFree(who) && row.ownerId === who.id
const isOther = (who: Actor, person: Person) => who.kind === 'person' && who.id !== person.id

/**
 * Every permission there is, and who has it. Pure: what is asked for stands in the arguments. `permit` holds verbs to
 * this table, pages ask it what to show, and `<thing>:read` decides whether someone is told that a thing exists.
 */
export const RULES = {
  // One's own account.
  'account:read': (who: Actor, account: Account) => isPresent(who) && who.id === account.id,
  'account:change': isSelf,
  'account:end-sessions': (who: Actor, account: Account) => isPresent(who) && who.id === account.id,
  'account:set-up-second-factor': (who: Actor, account: Account) =>
    isPresent(who) && who.id === account.id && (who.role === 'staff' || who.role === 'admin'),
  'account:remove-second-factor': (who: Actor, account: Account) => isSelf(who, account) && !isAdmin(who),
  'account:download': isSelf,
  'account:delete': isSelf,

  // The workshop's own pages. What each shows is a permission of its own.
  'workshop:enter': (who: Actor) => isStaff(who),

  // Other people's accounts. Nobody changes their own role or locks themselves out.
  'people:read': (who: Actor) => isAdmin(who),
  'people:invite': (who: Actor) => isAdmin(who),
  'person:read': (who: Actor, _person: Person) => isAdmin(who),
  'person:change-role': (who: Actor, person: Person) => isAdmin(who) && isOther(who, person),
  'person:disable': (who: Actor, person: Person) => isAdmin(who) && isOther(who, person),
  'person:enable': (who: Actor, person: Person) => isAdmin(who) && isOther(who, person),

  // The shelf: what someone owns is theirs alone.
  'shelf:read': (who: Actor) => isFree(who),
  'unit:add': (who: Actor) => isFree(who),
  'unit:read': owns,
  'unit:change': owns,
  'unit:remove': owns,
  'cartridge:add': (who: Actor) => isFree(who),
  'cartridge:read': owns,
  'cartridge:change': owns,
  'cartridge:remove': owns,

  // A sheet is reached by its code, and whoever holds the code may read it. While nobody keeps it on a shelf, the code
  // is also what changes it; after that its owner does.
  'sheet:read': (_who: Actor, _sheet: Owned) => true,
  'sheet:change': (who: Actor, sheet: Owned) => sheet.ownerId === null || owns(who, sheet),
  'sheet:keep': (who: Actor, sheet: Owned) => isFree(who) && sheet.ownerId === null,
  'sheet:name': owns,
  'sheet:place': owns,
  'sheet:archive': owns,

  // Mail on its way out, and the local mailbox that stands in for a mail server.
  'outbox:read': (who: Actor) => isStaff(who),
  'outbox:send-again': (who: Actor) => isAdmin(who),
  'mailbox:read': (who: Actor) => isAdmin(who),
}

export type Permission = keyof typeof RULES
