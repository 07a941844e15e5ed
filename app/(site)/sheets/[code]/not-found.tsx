import { OpenByCode } from '@/components/setups/open-by-code'

/** The same for a code that never was, one that was replaced and a number. */
export default function NoSheetPage() {
  return (
    <main id="main" className="w lost">
      <h1>There is no sheet under this code</h1>
      <p className="lead">
        A new code may have been made since, or a letter went wrong on the way. A sheet&rsquo;s number opens nothing: it is for saying on the
        phone.
      </p>
      <OpenByCode />
    </main>
  )
}
