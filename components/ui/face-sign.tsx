/** Triangle at the long point: down where it lies on top, up where it lies underneath, as in the drawings. */
export function FaceSign({ face }: { face: 'top' | 'underside' }) {
  return (
    <svg className="face-sign" width="14" height="11" viewBox="0 0 14 11" aria-hidden="true">
      <path d={face === 'top' ? 'M0 0h14L7 11z' : 'M0 11h14L7 0z'} fill="currentColor" />
    </svg>
  )
}
