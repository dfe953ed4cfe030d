import { PlaceLinks } from './place-links'

/** The places at the foot of a phone. */
export const PhoneTabs = () => (
  <nav aria-label="Places" className="phone-tabs">
    <PlaceLinks className="phone-tab" />
  </nav>
)
