import { sumOf } from '@/lib/air-and-oil/sums';
import { PERMITTED } from '@/lib/auth/permissions';
import { shown } from '@/lib/bench/show';
import { workOut } from '@/lib/bench/work-out';
import { invalid, notFound } from '@/lib/errors';
import { workOutInput } from '@/lib/schemas/bench';
import { writingOf } from '../case/writing';
import { defineRead } from '../define';

/** A sum of the bench for a script: the same as the page works out, in the units of whoever asks. */
export const workOutSum = defineRead({
  name: 'work-out.sum',
  doing: 'use the bench',
  roles: PERMITTED['bench.use'],
  input: workOutInput,
  run: async ({ ctx, input: { sum: id, inputs } }) => {
    const sum = sumOf(id);
    if (!sum) throw notFound('sum');
    const unknown = Object.keys(inputs).filter((name) => !sum.inputs.some((one) => one.id === name));
    if (unknown.length > 0) throw invalid(Object.fromEntries(unknown.map((name) => [`inputs.${name}`, `This sum takes ${sum.inputs.map((one) => one.id).join(', ')}.`])));
    const writing = writingOf(ctx);
    const worked = workOut(sum, inputs, writing);
    if (worked.kind === 'refused') throw invalid(Object.fromEntries(Object.entries(worked.errors).map(([field, message]) => [`inputs.${field}`, message])));
    const used = worked.inputs.map(({ id: inputId, typed, unit, si, halfWidthSi }) => ({ id: inputId, typed, unit, si, halfWidthSi }));
    if (worked.kind === 'never') return { sum: id, never: worked.because, outputs: [], band: null, notes: [], inputs: used };
    const { values, band, notes } = worked;
    return {
      sum: id,
      never: null,
      outputs: sum.outputs.map((output) => {
        const si = values[output.id];
        return { id: output.id, label: output.label, quantity: output.quantity, si: si ?? null, text: si === undefined ? null : shown(si, output, writing) };
      }),
      band: band ? { output: sum.main, low: band.low ?? null, high: band.high ?? null, shares: band.shares.map(({ input, share }) => ({ input, share })) } : null,
      notes: [...notes],
      inputs: used,
    };
  },
});
