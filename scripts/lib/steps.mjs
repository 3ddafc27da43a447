const LABEL_WIDTH = 74;

/** @param {number} milliseconds */
const seconds = (milliseconds) => `${(milliseconds / 1000).toFixed(1)} s`.padStart(8);

/**
 * Prints one line a step: what it does while it runs, what came of it and how long it took when it has.
 * @param {NodeJS.WritableStream} [out]
 */
export function stepPrinter(out = process.stdout) {
  let open = false;
  return {
    /**
     * @template T
     * @param {string} label what the step does
     * @param {(say: (detail: string) => void) => T | Promise<T>} work may `say` what came of it
     * @returns {Promise<T>}
     */
    async step(label, work) {
      const began = performance.now();
      let detail = '';
      out.write(`  ${label}`);
      open = true;
      const result = await work((text) => {
        detail = text === '' ? '' : `: ${text}`;
      });
      const filled = `${label}${detail}`.length;
      out.write(`${detail}${' '.repeat(Math.max(1, LABEL_WIDTH - filled))}${seconds(performance.now() - began)}\n`);
      open = false;
      return result;
    },
    /** Ends the line of a step that didn't come to its end. */
    breakOff() {
      if (open) out.write('\n');
      open = false;
    },
    /** @param {string} [text] */
    line(text = '') {
      this.breakOff();
      out.write(`${text}\n`);
    },
  };
}
