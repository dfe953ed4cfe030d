/** What stood in the way of the whole form, above its button. */
export function FormProblem({ children }: { children: string | undefined }) {
  if (!children) return null
  return (
    <p role="alert" className="mb-4 border-l-8 border-off bg-field px-4 py-3">
      {children}
    </p>
  )
}
