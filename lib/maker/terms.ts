/** The maker who runs this, as it signs itself and as it is reached. */
export const MAKER = {
  name: 'Oskerby',
  fullName: 'Oskerby Audio Works',
  address: 'workshop@oskerby.example',
} as const
