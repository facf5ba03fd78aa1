import { promisify } from 'node:util'
import { constants, zstdCompress, zstdCompressSync, zstdDecompressSync } from 'node:zlib'

/** The frame carries a checksum, so that a damaged blob is named itself and not only the record it belongs to. */
const params = { [constants.ZSTD_c_checksumFlag]: 1 }
const compress = promisify(zstdCompress)

/** Text as a compressed blob, and back. `unpack` throws where the bytes are damaged. */
export const pack = (text: string): Uint8Array => zstdCompressSync(text, { params })
export const unpack = (blob: Uint8Array): string => zstdDecompressSync(blob).toString('utf8')
/** As `pack`, beside the event loop. */
export const packLater = (text: string): Promise<Uint8Array> => compress(text, { params })
