import 'server-only'
import type { Context } from '../kernel/context'
import { findArms, findCartridges, findInputs, findLeads, findStepUps, type Found, type Search } from './queries'
import type { CatalogueSearch } from './schema-search'
import type { InputKind, LeadUse, ListedCartridgeType, SearchedKind } from './terms'
import type { ArmView, CartridgeView, InputView, LeadView, StepUpView } from './views'

export type EntryView = CartridgeView | ArmView | StepUpView | LeadView | InputView

// The schema has checked that the type is one of its kind.
const FINDERS: Record<SearchedKind, (context: Pick<Context, 'db'>, search: Search) => Found<EntryView>> = {
  cartridges: (context, search) => findCartridges(context, search as Search<ListedCartridgeType>),
  arms: findArms,
  'step-ups': findStepUps,
  leads: (context, search) => findLeads(context, search as Search<LeadUse>),
  inputs: (context, search) => findInputs(context, search as Search<InputKind>),
}

/** Looks through any of the searched kinds. @throws Fault bad_input for a cursor that is not ours */
export function findEntries(context: Pick<Context, 'db'>, { kind, q, type, limit, cursor }: CatalogueSearch): Found<EntryView> {
  return FINDERS[kind](context, { text: q, type, limit, cursor })
}
