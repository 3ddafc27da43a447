/** `npm run rank -- findings.json`: ranks a file of findings, with no database. */
import { readFileSync } from 'node:fs';
import { parseArgs } from 'node:util';
import { compileRulebook, lineOf, RulebookError, type CompiledRulebook, type Rulebook } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { InputError } from './rank/input-error';
import { listChecks, listText } from './rank/list';
import { reportText } from './rank/print';
import { readInput } from './rank/read-findings';
import { reportOn } from './rank/report';

const HELP = `Ranks the causes of a case from a file of findings, with reasons and the next checks.

  npm run rank -- findings.json          for people
  npm run rank -- --json findings.json   for scripts
  npm run rank -- --list                 every check with its answers
  ... --rulebook file.json               another rulebook than the default one
  ... -                                  reads the findings from standard input

The file, short:
  { "findings": { "when-it-began": "at-once", "build-up-time": "48 s" } }
or in full:
  { "findings": [
      { "check": "when-it-began", "answer": "at-once", "sure": false },
      { "check": "build-up-time", "value": "48 s", "error": "1 s" },
      { "check": "noise", "answer": "can't tell" } ],
    "record": { "drainOpening": "small-hole", "milesSinceFit": "60 mi" } }

answer  one of the check's answers, "can't tell" or "skip"
sure    false for "think so"; true when left out
value   text with a unit, or a number in the check's unit
error   of the instrument, likewise; left out: the check's usual error
record  what unit, model and fit know: text, or a number in SI; answers given overrule it

Exit code: 0 when ranked, 1 with one line on standard error when something is wrong with the input.`;

async function main(): Promise<void> {
  const { values, positionals } = readArguments();
  if (values.help) return console.log(HELP);
  const compiled = compiledRulebook(values.rulebook);
  if (values.list) {
    const checks = listChecks(compiled);
    return console.log(values.json ? JSON.stringify(checks, null, 2) : listText(checks));
  }
  const [file, ...more] = positionals;
  if (file === undefined || more.length > 0) throw new InputError('give one file of findings; --help shows how');
  const report = await reportOn(compiled, readInput(readText(file), compiled));
  console.log(values.json ? JSON.stringify(report, null, 2) : reportText(report));
}

function readArguments() {
  try {
    return parseArgs({
      allowPositionals: true,
      options: {
        help: { type: 'boolean', short: 'h' },
        json: { type: 'boolean' },
        list: { type: 'boolean' },
        rulebook: { type: 'string' },
      },
    });
  } catch (error) {
    throw new InputError(error instanceof Error ? error.message : String(error));
  }
}

function readText(file: string): string {
  try {
    return readFileSync(file === '-' ? 0 : file, 'utf8');
  } catch (error) {
    throw new InputError(`can’t read ${file}: ${error instanceof Error ? error.message : String(error)}`);
  }
}

function compiledRulebook(file: string | undefined): CompiledRulebook {
  if (file === undefined) return compileRulebook(defaultRulebook);
  let json: unknown;
  try {
    json = JSON.parse(readText(file));
  } catch (error) {
    throw error instanceof InputError ? error : new InputError(`${file} is not JSON`);
  }
  try {
    // Whatever it is, compileRulebook looks before it believes.
    return compileRulebook(json as Rulebook);
  } catch (error) {
    if (!(error instanceof RulebookError)) throw error;
    const [first] = error.problems;
    const more = error.problems.length > 1 ? ` (and ${error.problems.length - 1} more)` : '';
    throw new InputError(`${file}: ${first ? lineOf(first) : 'is no rulebook'}${more}`);
  }
}

main().catch((error: unknown) => {
  if (!(error instanceof InputError)) throw error;
  console.error(`rank: ${error.message}`);
  process.exitCode = 1;
});
