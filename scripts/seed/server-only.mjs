// @ts-check
/**
 * A script is no bundle: the marker that keeps server code out of browsers has nothing to guard here and would throw.
 * @type {import('node:module').ResolveHook}
 */
export function resolve(specifier, context, next) {
  if (specifier === 'server-only') return { url: 'data:text/javascript,', shortCircuit: true }
  return next(specifier, context)
}
