/** A refusal the product expects. `lib/http` gives each its status, once for all. */
abstract class Expected extends Error {}

/** There is no such row, or it is not this actor's to know of: both are answered alike. */
export class NotFound extends Expected {
  override name = 'NotFound'
}

/** This role does not do that. */
export class Denied extends Expected {
  override name = 'Denied'
  constructor(message = 'Your sign-in does not do that.') {
    super(message)
  }
}

/** Somebody saved in between. `current` is the version that stands now. */
export class Conflict extends Expected {
  override name = 'Conflict'
  constructor(
    message: string,
    readonly current?: number,
  ) {
    super(message)
  }
}

/** What was sent cannot be taken: one sentence a wrong field. */
export class Unfit extends Expected {
  override name = 'Unfit'
  constructor(readonly errors: { field: string; message: string }[]) {
    super('Some of this cannot be taken as it stands.')
  }
}

/** Too many tries. */
export class TooMany extends Expected {
  override name = 'TooMany'
  constructor(readonly retryAfterSeconds: number) {
    super(`Too many tries. Wait ${waitInWords(retryAfterSeconds)}, then try again.`)
  }
}

function waitInWords(seconds: number): string {
  const minutes = Math.ceil(seconds / 60)
  return minutes === 1 ? 'a minute' : `${minutes} minutes`
}
