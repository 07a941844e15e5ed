/**
 * Short arrays by the thousand. A typed array of its own costs an allocation outside the heap and a visit of the
 * collector each; these are views into larger blocks, which go when the last view goes. Always zero when handed out.
 */

const BLOCK = 1 << 16

let floats = new Float64Array(0)
let floatsUsed = 0
let bytes = new Uint8Array(0)
let bytesUsed = 0

export function newFloats(count: number): Float64Array {
  if (floatsUsed + count > floats.length) {
    floats = new Float64Array(Math.max(BLOCK, count))
    floatsUsed = 0
  }
  floatsUsed += count
  return floats.subarray(floatsUsed - count, floatsUsed)
}

export function newBytes(count: number): Uint8Array {
  if (bytesUsed + count > bytes.length) {
    bytes = new Uint8Array(Math.max(BLOCK, count))
    bytesUsed = 0
  }
  bytesUsed += count
  return bytes.subarray(bytesUsed - count, bytesUsed)
}
