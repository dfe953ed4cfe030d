// @ts-check
/**
 * A command for the npm that started us, or for the one on the path.
 * @param {...string} args
 * @returns {[string, string[]]} command and arguments
 */
export function npm(...args) {
  const script = process.env.npm_execpath
  return script?.endsWith('.js') ? [process.execPath, [script, ...args]] : ['npm', args]
}
