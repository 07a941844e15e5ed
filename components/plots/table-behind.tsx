/** The same figures as a drawing, as a table: for everyone who cannot see it, and for reading a value off exactly. */
export function TableBehind({
  caption,
  columns,
  rows,
}: {
  caption: string
  columns: readonly string[]
  /** The first cell of a row is its heading. */
  rows: readonly (readonly string[])[]
}) {
  return (
    <details className="tbh no-p">
      <summary>Show as a table</summary>
      <table>
        <caption className="vh">{caption}</caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <th scope="col" key={column}>
                {column}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(([heading = '', ...cells]) => (
            <tr key={heading}>
              <th scope="row">{heading}</th>
              {cells.map((cell, i) => (
                <td key={columns[i + 1] ?? i}>{cell}</td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  )
}
