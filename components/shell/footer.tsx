import type { Theme } from '@/lib/appearance/terms'
import { PlaceLink } from './place-link'
import { ThemeChoice } from './theme-choice'

export function Footer({ theme }: { theme: Theme }) {
  return (
    <footer className="foot">
      <div className="w">
        <span>Oskerby Audio Works</span>
        <nav aria-label="About this service">
          <PlaceLink href="/privacy">Privacy</PlaceLink>
          <PlaceLink href="/accessibility">Accessibility</PlaceLink>
          <PlaceLink href="/repairs">Repairs</PlaceLink>
        </nav>
        <ThemeChoice chosen={theme} />
        <span>Set-up service runs on Setdown</span>
      </div>
    </footer>
  )
}
