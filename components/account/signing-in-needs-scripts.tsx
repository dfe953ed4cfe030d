/** Said where scripts are off. */
export const SigningInNeedsScripts = () => (
  <noscript>
    <p className="needs-scripts">
      Signing in needs scripts, and this browser runs none. Every calculator’s example can still be read.
    </p>
  </noscript>
)
