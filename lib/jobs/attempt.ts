/** One try of a job. */
export interface Attempt {
  jobId: string;
  /** Nobody tries it again by itself after this. */
  isLast: boolean;
}

/** Thrown by a job that would fail the same way however often it is tried: it fails for good at once. */
export class NoUseTrying extends Error {
  constructor(message: string, options?: ErrorOptions) {
    super(message, options);
    this.name = 'NoUseTrying';
  }
}
