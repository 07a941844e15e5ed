import { VerdictMark } from '@/components/ui/verdict-mark'

/** Said in place, with everything still in the form. The answers are also kept on the device. */
export function LostConnection({ lost, again }: { lost: boolean; again: string }) {
  return (
    <div role="alert">
      {lost && (
        <p className="err">
          <VerdictMark mark="error" />
          <span>
            We lost the connection. Your answers are kept on this <span className="on-phone">phone</span>
            <span className="on-desk">computer</span>.{' '}
            <button className="lnk" type="submit" name="go" value="next">
              Send again
            </button>
            <span className="vh"> ({again})</span>
          </span>
        </p>
      )}
    </div>
  )
}
