/** The colours steel takes as it is heated. Decoration: it says nothing on its own. */
export const HeatLine = () => <div className="heat-line" aria-hidden="true" />
