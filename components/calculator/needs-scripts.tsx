/** Said where scripts are off: the page then stands as it was printed. */
export const NeedsScripts = () => (
  <noscript>
    <p className="needs-scripts">
      This browser runs no scripts, so nothing is worked out here. The numbers, the drawing and the working below are
      those of an example.
    </p>
  </noscript>
)
