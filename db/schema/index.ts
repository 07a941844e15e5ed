/** Every table, in one object: Drizzle wants it so. One line a domain. */
export * from './accounts'
export * from './catalogue'
export * from './mail'
export * from './meta'
export * from './setups'
export * from './shelf'
