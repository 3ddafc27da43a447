/**
 * Errors that a person can do something about. They are thrown by services, mapped once to a response by the
 * wrappers of lib/auth, and their message is shown as it is: a plain sentence, no stack, no SQL, no ids.
 */
export type FieldErrors = Record<string, string>;

export type ErrorCode =
  | 'not-signed-in'
  | 'forbidden'
  | 'not-found'
  | 'invalid'
  | 'conflict'
  /** What somebody changed is not as it was when he or she read it. */
  | 'stale'
  /** A change has to say which state it is of. */
  | 'unconditional'
  | 'too-many'
  | 'too-large';

export class AppError extends Error {
  constructor(
    readonly code: ErrorCode,
    message: string,
    /** Message by field name, to stand next to the field. */
    readonly fields: FieldErrors = {},
    options?: ErrorOptions,
  ) {
    super(message, options);
    this.name = 'AppError';
  }
}

export const notSignedIn = () => new AppError('not-signed-in', 'You are not signed in any more. Sign in again; nothing that was saved is lost.');

/** Also for rows of another organisation: that they exist is none of our business to tell. */
export const notFound = (what: string) => new AppError('not-found', `This ${what} does not exist, or is not your organisation's.`);

export const forbidden = (doing: string) => new AppError('forbidden', `Your role does not allow you to ${doing}. An administrator can change that.`);

export const invalid = (fields: FieldErrors, message = 'Some of what you entered needs another look.') => new AppError('invalid', message, fields);

export const conflict = (message: string, fields: FieldErrors = {}) => new AppError('conflict', message, fields);

export const tooMany = (message: string) => new AppError('too-many', message);
