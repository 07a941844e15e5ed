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
  // A native module and a logger that starts worker threads: both are required at run time, not bundled.
  serverExternalPackages: ['better-sqlite3', 'pino'],
  headers: async () => [{ source: '/:path*', headers: fixedHeaders }],
}

export default config
