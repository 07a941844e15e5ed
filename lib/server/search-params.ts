import 'server-only'

export type SearchParams = Promise<Record<string, string | string[] | undefined>>

/** One value of an address, as a text; nothing where it is missing or there are several. */
export async function oneParam(params: SearchParams, name: string): Promise<string> {
  const value = (await params)[name]
  return typeof value === 'string' ? value : ''
}
