// @ts-check
const plainEveryMs = 15_000

/**
 * Run one long step with its name and the seconds gone by on screen: one line rewritten on a terminal,
 * plain lines now and then elsewhere. The step's own failure passes through.
 * @template T
 * @param {string} name begins with a verb: 'Installing packages'
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function step(name, work) {
  const began = Date.now()
  const seconds = () => `${Math.round((Date.now() - began) / 1000)} s`
  const rewrite = process.stdout.isTTY
  const say = (/** @type {string} */ text) => process.stdout.write(rewrite ? `\r\u001b[2K  ${text}` : `  ${text}\n`)
  say(`${name} …`)
  const timer = setInterval(() => say(`${name} … ${seconds()}`), rewrite ? 1000 : plainEveryMs)
  try {
    const result = await work()
    say(`${name}: done in ${seconds()}`)
    return result
  } catch (error) {
    say(`${name}: stopped after ${seconds()}`)
    throw error
  } finally {
    clearInterval(timer)
    if (rewrite) process.stdout.write('\n')
  }
}
