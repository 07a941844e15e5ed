/** What a form shows after it was sent: nothing yet, what is wrong, or that it is done. */
export interface FormState {
  done: boolean
  /** For the person: what is wrong with all of it, or what happened. */
  words: string | null
  /** One sentence for each field that has something wrong. */
  fields: Record<string, string>
  /** What stood in the form, without passwords and codes. */
  values: Record<string, string>
  /** Something that is shown this once, such as new recovery codes. */
  shown?: string[]
}

export const UNTOUCHED: FormState = { done: false, words: null, fields: {}, values: {} }

export type FormAction = (before: FormState, form: FormData) => Promise<FormState>
