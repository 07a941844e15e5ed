/** After this long without an answer the connection counts as lost. */
const PATIENCE_MILLISECONDS = 8000

/**
 * Asks before leaving the page: a page that cannot be fetched would leave the owner with the browser's own error and
 * without the form.
 */
export async function canReachUs(): Promise<boolean> {
  try {
    await fetch('/api/health', { cache: 'no-store', signal: AbortSignal.timeout(PATIENCE_MILLISECONDS) })
    return true
  } catch {
    return false
  }
}
