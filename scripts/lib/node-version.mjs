/** The oldest Node that Next and our own scripts run on. */
const OLDEST = [20, 9];

/**
 * Says in one sentence why this Node won't do, or nothing when it will.
 * @param {string} version as `process.versions.node` gives it
 * @returns {string | undefined}
 */
export function nodeVersionProblem(version) {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  const enough = major > OLDEST[0] || (major === OLDEST[0] && minor >= OLDEST[1]);
  return enough
    ? undefined
    : `Carryover needs Node ${OLDEST.join('.')} or later and this is Node ${version}. Install Node 20 or later, then run the command again.`;
}

/** Ends the process when Node is too old; called before anything newer than old Node can parse is loaded. */
export function requireNode() {
  const problem = nodeVersionProblem(process.versions.node);
  if (problem === undefined) return;
  console.error(problem);
  process.exit(1);
}
