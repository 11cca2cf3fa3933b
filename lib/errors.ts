/** What is wrong with one field of an input: which, why, and the bound with its unit where there is one. */
export interface FieldIssue {
  readonly field: string;
  readonly message: string;
  readonly received?: unknown;
  readonly bound?: number;
  readonly unit?: string;
}

/** The input cannot be used; every field at fault is listed. Maps to HTTP 422. */
export class InvalidInput extends Error {
  constructor(readonly issues: readonly FieldIssue[]) {
    super(issues.map((issue) => `${issue.field}: ${issue.message}`).join('; '));
    this.name = 'InvalidInput';
  }
}

/** What was asked for does not exist. Maps to HTTP 404. */
export class NotFound extends Error {
  constructor(readonly what: string) {
    super(`${what} was not found`);
    this.name = 'NotFound';
  }
}

/** The answer would be larger than allowed. Maps to HTTP 413. */
export class TooLarge extends Error {
  constructor(message: string) {
    super(message);
    this.name = 'TooLarge';
  }
}

/** The server cannot do it now but may a little later. Maps to HTTP 503. */
export class Unavailable extends Error {
  constructor(message: string) {
    super(message);
    this.name = 'Unavailable';
  }
}

/** Only for members who have signed in. Maps to HTTP 401. */
export class SignInNeeded extends Error {
  constructor() {
    super('Sign in to do this');
    this.name = 'SignInNeeded';
  }
}

/** The member's roles do not allow it. Maps to HTTP 403. */
export class NotAllowed extends Error {
  constructor() {
    super('Your account may not do this');
    this.name = 'NotAllowed';
  }
}

/** It was changed elsewhere in the meantime. Maps to HTTP 409. */
export class Conflict extends Error {
  constructor(message: string) {
    super(message);
    this.name = 'Conflict';
  }
}

/** Tried too often. Maps to HTTP 429. */
export class TooMany extends Error {
  constructor(readonly seconds: number) {
    super(
      `Too many attempts. Try again in ${seconds < 90 ? `${seconds} s` : `${Math.ceil(seconds / 60)} minutes`}`,
    );
    this.name = 'TooMany';
  }
}
