/** Question and help in the words column, what answers it beside them. */
export function FieldRow({
  id,
  question,
  help,
  className = '',
  children,
}: {
  id: string
  question: string
  help?: string
  className?: string
  children: React.ReactNode
}) {
  return (
    <div id={id} className={`fld ${className}`.trim()} role="group" aria-labelledby={`${id}-q`} aria-describedby={help ? `${id}-h` : undefined}>
      <div>
        <div className="q" id={`${id}-q`}>
          {question}
        </div>
        {help && (
          <p className="h" id={`${id}-h`}>
            {help}
          </p>
        )}
      </div>
      <div>{children}</div>
    </div>
  )
}
