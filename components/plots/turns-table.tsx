import { TableBehind } from './table-behind'
import type { Turns } from './turns-facts'
import { joinedStretches, stretchText, TURN_WORDS } from './turns-facts'

/** The number to find next as a table: a row for each stretch. */
export function TurnsTable(turns: Turns) {
  return (
    <TableBehind
      caption="Where our advice changes"
      columns={['If it is', 'Verdict', 'What to do']}
      rows={joinedStretches(turns).map((stretch) => [
        stretchText(stretch, turns),
        TURN_WORDS[stretch.verdict],
        stretch.text || 'Nothing',
      ])}
    />
  )
}
