/** This process's environment without what the test runner put there for itself. */
export const ownEnvironment = (): Record<string, string> =>
  Object.fromEntries(
    Object.entries(process.env).filter((entry): entry is [string, string] => entry[1] !== undefined && !/^(NODE_ENV|NODE_OPTIONS|VITEST.*|TEST|DEV|PROD|MODE|SSR|BASE_URL)$/.test(entry[0])),
  );
