import type { Theme } from '@/lib/appearance/terms'
import { ThemeChoice } from './theme-choice'

export function Footer({ theme }: { theme: Theme }) {
  return (
    <footer className="foot">
      <div className="w">
        <span>Oskerby Audio Works</span>
        <ThemeChoice chosen={theme} />
        <span>Set-up service runs on Setdown</span>
      </div>
    </footer>
  )
}
