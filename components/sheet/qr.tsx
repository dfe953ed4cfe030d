import { qrModules } from '@/lib/print/sheet/qr'

/** An address as a QR code; nothing where it is too long for one. */
export function Qr({ address, label }: { address: string; label: string }) {
  const code = qrModules(address)
  if (!code) return null
  const { size, dark } = code
  const path = dark.flatMap((on, i) => (on ? [`M${i % size} ${Math.floor(i / size)}h1v1h-1z`] : [])).join('')
  return (
    <svg className="printed-qr" viewBox={`-4 -4 ${size + 8} ${size + 8}`} role="img" aria-label={label}>
      <path d={path} fill="currentColor" shapeRendering="crispEdges" />
    </svg>
  )
}
