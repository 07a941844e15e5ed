import Link from 'next/link'
import { toQuery, type AnswersInput } from '@/lib/setups/schema'
import type { Step } from '@/lib/setups/terms'
import { stepViews } from '@/lib/setups/views-steps'

/** The four steps in the order of the signal; each leads there with every answer along. */
export function Stepper({ step, raw, modelName }: { step: Step; raw: AnswersInput; modelName: string | null }) {
  const query = toQuery(raw)
  return (
    <nav aria-label="Steps of the check">
      <ol className="stp">
        {stepViews(raw, modelName).map((view, index) => {
          const words = (
            <>
              <b>
                {index + 1}. {view.name}
              </b>
              <span>{view.line}</span>
            </>
          )
          if (view.step === step) {
            return (
              <li key={view.step} aria-current="step">
                {words}
              </li>
            )
          }
          return (
            <li key={view.step} className={view.answered ? undefined : 'todo'}>
              <Link href={`${view.path}${query && `?${query}`}`} prefetch={false}>
                {words}
              </Link>
            </li>
          )
        })}
      </ol>
    </nav>
  )
}
