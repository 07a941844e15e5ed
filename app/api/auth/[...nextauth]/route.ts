import type { NextRequest } from 'next/server'
import NextAuth from 'next-auth'
import { authOptions } from '@/lib/server/auth-options'
import { env } from '@/lib/server/env'

export const dynamic = 'force-dynamic'

/** Sign-in for programs: CSRF token, the two ways in, the present session, signing out. The pages call the same verbs. */
function handler(request: NextRequest, context: { params: Promise<{ nextauth: string[] }> }) {
  // next-auth reads its own address from the environment, and there is one place to set ours.
  process.env.NEXTAUTH_URL ??= env().publicAddress
  return NextAuth(request, context, authOptions())
}

export { handler as GET, handler as POST }
