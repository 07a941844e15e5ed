'use client'

import Link from 'next/link'
import type { ReactNode } from 'react'
import type { z } from 'zod'
import { FormWords } from '@/components/forms/form-words'
import { useActionForm, type FieldWiring } from '@/components/forms/use-action-form'
import type { FormAction } from '@/lib/forms/terms'
import { Done } from './done'

interface Props {
  schema: z.ZodType
  action: FormAction
  token: string
  title: string
  words: ReactNode
  button: string
  /** Where a new link can be had. */
  again: { href: string; words: string }
  /** What stands here once it is done and no other page follows. */
  doneTitle?: string
  fields?: (field: (name: string) => FieldWiring) => ReactNode
}

/** What a link from a mail leads to: nothing has happened yet, and one press makes it happen. */
export function TokenForm({ schema, action, token, title, words, button, again, doneTitle = 'Done', fields }: Props) {
  const { state, pending, form, field } = useActionForm(schema, action)
  if (state.done) return <Done title={doneTitle} words={state.words} />
  return (
    <form {...form}>
      <h1>{title}</h1>
      <p>{words}</p>
      <input type="hidden" {...field('token').field} defaultValue={token} />
      {fields?.(field)}
      <FormWords words={state.words}>
        <Link href={again.href}>{again.words}</Link>
      </FormWords>
      <button className="b pri" type="submit" disabled={pending}>
        {button}
      </button>
    </form>
  )
}
