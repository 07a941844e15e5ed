/** The page's primary. It never goes dead for a missing value: "Don't know" is an answer. */
export function SubmitButton({ children, waiting }: { children: React.ReactNode; waiting: boolean }) {
  return (
    <>
      <button className="b pri" type="submit" name="go" value="next">
        {children}
      </button>
      <span className="vh" role="status">
        {waiting ? 'One moment' : ''}
      </span>
    </>
  )
}
