import { VerdictMark } from '@/components/ui/verdict-mark'

/**
 * What is wrong with a field, and the way out. The region is always there, so that a sentence which turns up in it is
 * read out. Without script the fix is sent as the form's answer.
 */
export function TroubleLine({
  id,
  sentence,
  fix,
}: {
  id: string
  sentence: string | null
  fix: { label: string; go: string; apply: () => void } | null
}) {
  return (
    <div id={id} aria-live="polite">
      {sentence !== null && (
        <p className="err">
          <VerdictMark mark="error" />
          <span>
            {sentence}{' '}
            {fix && (
              <button
                className="lnk"
                type="submit"
                name="go"
                value={fix.go}
                onClick={(event) => {
                  event.preventDefault()
                  fix.apply()
                }}
              >
                {fix.label}
              </button>
            )}
          </span>
        </p>
      )}
    </div>
  )
}
