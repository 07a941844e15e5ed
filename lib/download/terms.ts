/** What the archive of everything we hold about someone is called, and where it comes from. */
export const DOWNLOAD_PATH = '/api/account/export'
export const ARCHIVE_NAME = 'oskerby-everything.zip'

/** How often one person may ask for it, in how many seconds: it reads all that they have. */
export const DOWNLOAD_LIMIT = { name: 'download', perAddress: 3, together: 30, seconds: 60 }
