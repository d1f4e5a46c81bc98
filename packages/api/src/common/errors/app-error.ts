/** One fault in what was sent: a dotted path into it and a message for a person. */
export interface FieldFault {
  readonly path: string;
  readonly message: string;
}

/** What the app refuses, in its own words; only the filter knows which HTTP status that is. */
export abstract class AppError extends Error {
  abstract readonly title: string;
}

export class NotFound extends AppError {
  readonly title = 'Not found';

  constructor(what: string) {
    super(`There is no such ${what}, or it is not yours to see.`);
  }
}

export class NotSignedIn extends AppError {
  readonly title = 'Not signed in';

  constructor(detail = 'Sign in first.') {
    super(detail);
  }
}

export class NotAllowed extends AppError {
  readonly title = 'Not allowed';

  constructor(detail: string) {
    super(detail);
  }
}

export class BadInput extends AppError {
  readonly title = 'Something in it cannot be';

  constructor(
    readonly faults: readonly FieldFault[],
    detail = faults.map(({ message }) => message).join(' '),
  ) {
    super(detail);
  }
}

/** It clashes with how things stand; `current` is how they stand. */
export class Conflict extends AppError {
  readonly title = 'It does not fit how things stand';

  constructor(
    detail: string,
    readonly current?: Readonly<Record<string, unknown>>,
  ) {
    super(detail);
  }
}

export class TooLarge extends AppError {
  readonly title = 'Too large';
}

export class WrongType extends AppError {
  readonly title = 'Not a kind that is taken';
}

export class TooMany extends AppError {
  readonly title = 'Too many tries';

  constructor(readonly retryAfterSeconds: number) {
    super(`Too many tries. Try again in ${retryAfterSeconds} seconds.`);
  }
}

/** Only one process writes; this one serves reads and sockets. */
export class ReadsOnly extends AppError {
  readonly title = 'Reads only here';

  constructor() {
    super('This process serves reads and live talk; send writes to the main one.');
  }
}

/** Alive, but nobody should be sent here yet; `checks` says what is wrong. */
export class NotReady extends AppError {
  readonly title = 'Not ready';

  constructor(readonly checks: Readonly<Record<string, string>>) {
    super(
      Object.entries(checks)
        .map(([what, state]) => `${what}: ${state}`)
        .join('; '),
    );
  }
}

/** The address exists, but not for this method; `allowed` says for which. */
export class WrongMethod extends AppError {
  readonly title = 'Not at this address';

  constructor(readonly allowed: readonly string[]) {
    super(`That cannot be done at this address, only ${allowed.join(', ')}.`);
  }
}

export function authorize(allowed: boolean, why: string): asserts allowed {
  if (!allowed) throw new NotAllowed(why);
}
