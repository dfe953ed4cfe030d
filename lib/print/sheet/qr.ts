import { create } from 'qrcode'

/** Above so many characters the code is too fine to be read off an inch of paper. */
const longest = 600

export interface QrModules {
  /** Modules along a side, without the quiet zone of four that readers ask for. */
  size: number
  /** Row by row from the upper left. */
  dark: readonly boolean[]
}

/** An address as a QR code, or null where it is too long for one. */
export function qrModules(address: string): QrModules | null {
  if (address === '' || address.length > longest) return null
  const { modules } = create(address, { errorCorrectionLevel: 'M' })
  return { size: modules.size, dark: Array.from(modules.data, Boolean) }
}
