import { inflateRawSync } from 'node:zlib'

const END = 0x06054b50
const ENTRY = 0x02014b50

/** The files of a zip archive, by their paths, after its central directory (PKWARE APPNOTE 6.3, 4.3.12 and 4.3.16). */
export function unzip(archive: Buffer): Map<string, Buffer> {
  let end = archive.length - 22
  while (end >= 0 && archive.readUInt32LE(end) !== END) end--
  if (end < 0) throw new Error('This is no zip archive.')
  const files = new Map<string, Buffer>()
  let at = archive.readUInt32LE(end + 16)
  for (let left = archive.readUInt16LE(end + 10); left > 0; left--) {
    if (archive.readUInt32LE(at) !== ENTRY) throw new Error('The archive’s directory is broken.')
    const method = archive.readUInt16LE(at + 10)
    const size = archive.readUInt32LE(at + 20)
    const [name, extra, comment] = [archive.readUInt16LE(at + 28), archive.readUInt16LE(at + 30), archive.readUInt16LE(at + 32)]
    const local = archive.readUInt32LE(at + 42)
    const from = local + 30 + archive.readUInt16LE(local + 26) + archive.readUInt16LE(local + 28)
    const packed = archive.subarray(from, from + size)
    files.set(archive.toString('utf8', at + 46, at + 46 + name), method === 0 ? packed : inflateRawSync(packed))
    at += 46 + name + extra + comment
  }
  return files
}
