import { settingsOrExit } from './support/settings-or-exit'

// Run before `next start`, which would live on with wrong settings and answer every page with an error.
settingsOrExit()
