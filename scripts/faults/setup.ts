import fc from 'fast-check';

/**
 * A planted fault only has to be noticed: fewer cases will do, and the smallest example of it interests nobody. The
 * unharmed copy is tried on the same cases, so that nothing turns red for being tried too little.
 */
fc.configureGlobal({ ...fc.readConfigureGlobal(), numRuns: 80, endOnFailure: true });
