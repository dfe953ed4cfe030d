// @ts-check
/** What has to be undone before this process ends, newest first. */

/** @type {Array<() => void | Promise<void>>} */
const undo = []
/** @type {Promise<void> | undefined} */
let unwinding

/**
 * Remember how to undo something. Returns a function that does it now and forgets it.
 * @param {() => void | Promise<void>} action
 * @returns {() => Promise<void>}
 */
export function defer(action) {
  undo.push(action)
  return async () => {
    const at = undo.indexOf(action)
    if (at === -1) return
    undo.splice(at, 1)
    await action()
  }
}

/**
 * Undo everything once, newest first; later callers wait for the same unwinding.
 * @returns {Promise<void>}
 */
export function unwind() {
  unwinding ??= (async () => {
    for (let action = undo.pop(); action; action = undo.pop()) {
      try {
        await action()
      } catch (error) {
        process.stderr.write(`Could not clean up: ${error instanceof Error ? error.message : String(error)}\n`)
      }
    }
  })()
  return unwinding
}

/** True once this process has begun to end: what fails now fails because it was told to stop. */
export function isUnwinding() {
  return unwinding !== undefined
}

/**
 * Ctrl-C, SIGTERM and a closed terminal undo everything, then end with the code a shell expects.
 * npm passes on the Ctrl-C that the terminal has sent already, so the same signal arrives twice: only unwind once.
 */
export function unwindOnSignals() {
  /** @type {Array<[NodeJS.Signals, number]>} */
  const codes = [
    ['SIGINT', 130],
    ['SIGTERM', 143],
    ['SIGHUP', 129],
  ]
  for (const [signal, code] of codes) {
    process.on(signal, () => {
      if (isUnwinding()) return
      process.stdout.write('\nStopping …\n')
      void unwind().then(() => process.exit(code))
    })
  }
  // What nobody caught ends this process at once; what it started must not outlive it.
  process.on('uncaughtException', (error) => {
    process.stderr.write(`\n${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`)
    void unwind().then(() => process.exit(1))
  })
  // A terminal that went away must not turn the clean-up into a crash.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {})
}
