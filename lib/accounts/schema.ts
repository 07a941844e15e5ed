import { z } from 'zod'
import { INVITED_ROLES, MAX_ADDRESS_LENGTH, MAX_NAME_LENGTH, PASSWORD_LENGTH, ROLES } from './terms'

const ADDRESS = 'Write the whole address, such as hettie@brandreth.example.'

const email = z
  .string(ADDRESS)
  .trim()
  .max(MAX_ADDRESS_LENGTH, 'That is longer than an address can be.')
  .pipe(z.email(ADDRESS))
const name = z
  .string('Say what we may call you.')
  .trim()
  .min(1, 'Say what we may call you.')
  .max(MAX_NAME_LENGTH, `Use no more than ${MAX_NAME_LENGTH} characters.`)
  .regex(/^\P{Cc}*$/u, 'Use letters on one line.')
/** One that is there already. It is never judged: only whether it is the right one. */
const presentPassword = z.string('Type your password.').min(1, 'Type your password.').max(1000, 'That is too long to be it.')
const newPassword = z
  .string('Choose a password.')
  .min(PASSWORD_LENGTH.min, `Use at least ${PASSWORD_LENGTH.min} characters. Four words that do not belong together are easy to keep in mind.`)
  .max(PASSWORD_LENGTH.max, `Use no more than ${PASSWORD_LENGTH.max} characters.`)
const token = z.string('This link opens nothing. A part of it may be missing.').min(1).max(100)
const id = z.string().min(1).max(60)
const SIX_FIGURES = 'The code has six figures.'
const code = z
  .string(SIX_FIGURES)
  .transform((text) => text.replace(/\s/g, ''))
  .pipe(z.string().regex(/^\d{6}$/, SIX_FIGURES))

export const SignInInput = z.object({ email, password: presentPassword })
export type SignInInput = z.infer<typeof SignInInput>

/** The sign-in page has one box for the address and two buttons. */
export const EnterInput = z.discriminatedUnion('how', [SignInInput.extend({ how: z.literal('password') }), z.object({ how: z.literal('link'), email })])
export type EnterInput = z.infer<typeof EnterInput>

/** Asking for a link, and asking for a new password: an address is all it takes. */
export const AddressInput = z.object({ email })
export type AddressInput = z.infer<typeof AddressInput>

export const JoinInput = z.object({ name, email, password: newPassword })
export type JoinInput = z.infer<typeof JoinInput>

/** A link from a mail whose button was pressed. */
export const LinkInput = z.object({ token })
export type LinkInput = z.infer<typeof LinkInput>

export const ConfirmAddressInput = z.object({ token, password: presentPassword })
export type ConfirmAddressInput = z.infer<typeof ConfirmAddressInput>

export const ResetPasswordInput = z.object({ token, password: newPassword })
export type ResetPasswordInput = z.infer<typeof ResetPasswordInput>

export const AcceptInvitationInput = z.object({ token, name, password: newPassword })
export type AcceptInvitationInput = z.infer<typeof AcceptInvitationInput>

export const ChangeNameInput = z.object({ name })
export type ChangeNameInput = z.infer<typeof ChangeNameInput>

/** The present password is left out by those who have none yet. */
export const ChangePasswordInput = z.object({ present: z.string().max(1000).default(''), password: newPassword })
export type ChangePasswordInput = z.infer<typeof ChangePasswordInput>

export const SessionInput = z.object({ sessionId: id })
export type SessionInput = z.infer<typeof SessionInput>

export const CodeInput = z.object({ code })
export type CodeInput = z.infer<typeof CodeInput>

const PROOF = 'Type a code of your authenticator, or one of your recovery codes.'
/** Either kind of code: six figures, or a recovery code. */
export const ProofInput = z.object({ code: z.string(PROOF).trim().min(1, PROOF).max(40, PROOF) })
export type ProofInput = z.infer<typeof ProofInput>

/** Replacing an authenticator takes such a code; a first one has none before it. */
export const BeginSecondFactorInput = z.object({ code: z.string().trim().max(40, PROOF).optional() })
export type BeginSecondFactorInput = z.infer<typeof BeginSecondFactorInput>

const RECOVERY = 'A recovery code has two groups of five, such as k7m2w-9qdh4.'
export const RecoveryCodeInput = z.object({ code: z.string(RECOVERY).trim().min(1, RECOVERY).max(40, RECOVERY) })
export type RecoveryCodeInput = z.infer<typeof RecoveryCodeInput>

const UNDERSTOOD = 'Tick the box first, so that this is no slip of the hand.'
export const AskForDeletionInput = z.object({ understood: z.literal('yes', UNDERSTOOD) })
export type AskForDeletionInput = z.infer<typeof AskForDeletionInput>

export const InviteInput = z.object({ email, role: z.enum(INVITED_ROLES, 'Choose staff or admin.') })
export type InviteInput = z.infer<typeof InviteInput>

export const PersonInput = z.object({ personId: id })
export type PersonInput = z.infer<typeof PersonInput>

export const ChangeRoleInput = z.object({ personId: id, role: z.enum(ROLES, 'Choose owner, staff or admin.') })
export type ChangeRoleInput = z.infer<typeof ChangeRoleInput>

/** For actions that take nothing but the press. */
export const NothingInput = z.object({})
