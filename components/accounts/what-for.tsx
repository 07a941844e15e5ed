const ROWS = [
  ['Check a cartridge', false],
  ['Open a sheet by its code', false],
  ['Something smells, smokes or tingles', false],
  ['Keep your sheets in one place', true],
] as const

/** What needs an account, and what does not. */
export function WhatFor() {
  return (
    <>
      <h2 id="what-for">What signing in is for</h2>
      <table aria-labelledby="what-for">
        <tbody>
          {ROWS.map(([what, needed]) => (
            <tr key={what}>
              <td>{what}</td>
              <td>{needed ? <b>Sign in</b> : 'No need to sign in'}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </>
  )
}
