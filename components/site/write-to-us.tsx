import { MAKER } from '@/lib/maker/terms'

/** The workshop's address, to press. */
export function WriteToUs() {
  return <a href={`mailto:${MAKER.address}`}>{MAKER.address}</a>
}
