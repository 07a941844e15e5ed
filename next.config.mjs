/** Headers that never vary. The Content-Security-Policy carries a nonce and is made for each request in proxy.ts. */
const fixedHeaders = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'X-Frame-Options', value: 'DENY' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
  { key: 'Permissions-Policy', value: 'camera=(), geolocation=(), microphone=(), payment=(), usb=()' },
]

/** @type {import('next').NextConfig} */
const config = {
  poweredByHeader: false,
  // Required at run time, not bundled: a native module, a logger that starts worker threads, and the writer of mails,
  // which needs React's renderer as it is outside of pages.
  serverExternalPackages: ['better-sqlite3', 'pino', '@react-email/components', '@react-email/render', 'nodemailer'],
  headers: async () => [
    { source: '/:path*', headers: fixedHeaders },
    // Shown in a frame on our own page, and nowhere else. The later of two wins.
    { source: '/workshop/mailbox/:id/html', headers: [{ key: 'X-Frame-Options', value: 'SAMEORIGIN' }] },
  ],
}

export default config
