import { EnvironmentError, parseEnvironment } from '@/lib/env';

/** Says before anything starts what the app would refuse at its first request. */
try {
  parseEnvironment(process.env);
} catch (error) {
  if (!(error instanceof EnvironmentError)) throw error;
  console.error(error.message);
  process.exit(1);
}
