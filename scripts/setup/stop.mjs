// @ts-check
/** A reason to stop that a person can act on: its message is printed as it stands, without a stack. */
export class Stop extends Error {
  /**
   * @param {string} message whole sentences, the last one saying what to do
   * @param {string} [detail] what a command printed, shown under the sentence
   */
  constructor(message, detail) {
    super(message)
    this.detail = detail
  }
}
