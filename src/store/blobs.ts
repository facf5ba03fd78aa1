import { zstdCompressSync, zstdDecompressSync } from 'node:zlib'

/** Text as a compressed blob, and back. */
export const pack = (text: string): Uint8Array => zstdCompressSync(text)
export const unpack = (blob: Uint8Array): string => zstdDecompressSync(blob).toString('utf8')
