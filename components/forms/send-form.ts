import { startTransition, type FormEvent } from 'react'

/**
 * Sends a form to its action and leaves what stands in it standing: React empties a form that it sends by itself. The
 * button that was pressed is sent along.
 */
export function sendForm(send: (form: FormData) => void) {
  return (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const { submitter } = event.nativeEvent as SubmitEvent
    const form = new FormData(event.currentTarget, submitter)
    startTransition(() => send(form))
  }
}
