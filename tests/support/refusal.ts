import { AppError } from '@/lib/errors';

/** The error that a person is shown; anything else, success included, fails the test. */
export async function refusalOf(work: Promise<unknown>): Promise<AppError> {
  try {
    await work;
  } catch (error) {
    if (error instanceof AppError) return error;
    throw error;
  }
  throw new Error('It was not refused.');
}
