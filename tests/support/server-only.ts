/** Vitest runs outside Next: the marker that keeps server code off the client has nothing to guard here. */
export {}
