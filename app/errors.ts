/** What a verb may throw, and the one table that says how each is answered over HTTP. */

export type FieldErrors = Record<string, string[]>;

export abstract class AppError extends Error {
  abstract readonly kind: ErrorKind;
}

/** The thing asked for is not there (or the asker may not know that it is). */
export class NotFound extends AppError {
  readonly kind = "not-found";
}

/** Nobody is signed in. */
export class Unauthenticated extends AppError {
  readonly kind = "unauthenticated";
}

/** Signed in, but not allowed to do this. */
export class Forbidden extends AppError {
  readonly kind = "forbidden";
}

/** Somebody else changed it first, or the state no longer permits it. */
export class Conflict extends AppError {
  readonly kind = "conflict";
}

/** A page of ours that helps to mend what is refused: the record that has an identifier already. */
export interface ErrorLink {
  to: string;
  label: string;
}

/** Input that a person can mend: messages by field name; "" is the form as a whole. */
export class Invalid extends AppError {
  readonly kind = "invalid";
  constructor(
    readonly fields: FieldErrors,
    message = Object.values(fields).flat()[0] ?? "Some of the input needs attention.",
    readonly links: readonly ErrorLink[] = [],
  ) {
    super(message);
  }
}

/** Held by a rule of the workflow (sealed, published) until something else happens. */
export class Locked extends AppError {
  readonly kind = "locked";
}

/** Larger than what is accepted. */
export class TooLarge extends AppError {
  readonly kind = "too-large";
}

/** Asked too often; `retryAfterSeconds` says when to come back. */
export class TooMany extends AppError {
  readonly kind = "too-many";
  constructor(
    message: string,
    readonly retryAfterSeconds: number,
  ) {
    super(message);
  }
}

/** A service that this needs (storage, database) did not answer. */
export class Unavailable extends AppError {
  readonly kind = "unavailable";
}

export type ErrorKind =
  | "not-found"
  | "unauthenticated"
  | "forbidden"
  | "conflict"
  | "invalid"
  | "locked"
  | "too-large"
  | "too-many"
  | "unavailable";

interface Answer {
  status: number;
  title: string;
  /** What the person can do next, in one sentence. */
  next: string;
}

export const ANSWERS: Record<ErrorKind, Answer> = {
  invalid: { status: 400, title: "Please check the input", next: "Mend the fields named below and send it again." },
  unauthenticated: { status: 401, title: "Please sign in", next: "Sign in and you will be brought back here." },
  forbidden: {
    status: 403,
    title: "This is not yours to do",
    next: "Ask a colleague who holds the role for it, or an administrator about your roles.",
  },
  "not-found": {
    status: 404,
    title: "Nothing is kept at this address",
    next: "Check the address, or look for it from the desk.",
  },
  conflict: {
    status: 409,
    title: "It changed in the meantime",
    next: "Load the page again to see how it stands now; what you typed is still in your form.",
  },
  "too-large": { status: 413, title: "That is too large", next: "Send a smaller file." },
  locked: { status: 423, title: "This is held", next: "See the page of the object for what has to happen first." },
  "too-many": { status: 429, title: "Too many attempts", next: "Wait a little and try again." },
  unavailable: {
    status: 503,
    title: "A service is not answering",
    next: "Nothing was changed. Try again in a minute; an administrator sees the state at /readyz.",
  },
};

export function answerFor(error: AppError): Answer {
  return ANSWERS[error.kind];
}

/** Titles and advice for statuses that reach an error page without an AppError behind them. */
export function answerForStatus(status: number): Answer {
  const known = Object.values(ANSWERS).find((answer) => answer.status === status);
  if (known) return known;
  if (status === 405) {
    return { status, title: "This address does not do that", next: "Go back and use the page's own buttons." };
  }
  if (status < 500) return { status, title: "The request could not be answered", next: "Go back and try another way." };
  return {
    status,
    title: "Something broke on our side",
    next: "Nothing was changed. Try again; if it stays, tell an administrator when it happened.",
  };
}
