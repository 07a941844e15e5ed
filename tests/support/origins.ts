import type { Origin } from '@/lib/accounts/origin'

const FIREFOX = 'Mozilla/5.0 (X11; Linux x86_64; rv:128.0) Gecko/20100101 Firefox/128.0'
const PHONE = 'Mozilla/5.0 (iPhone; CPU iPhone OS 17_5 like Mac OS X) AppleWebKit/605.1.15 (KHTML, like Gecko) Version/17.5 Mobile/15E148 Safari/604.1'

// Addresses of RFC 5737, which belong to nobody.
export const AT_HOME: Origin = { address: '203.0.113.7', userAgent: FIREFOX }
export const ON_PHONE: Origin = { address: '198.51.100.20', userAgent: PHONE }
