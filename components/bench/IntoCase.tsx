'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { keepAndSend } from '@/components/case/data/send-answer';
import type { Sum } from '@/lib/air-and-oil/sums/sum';
import type { SumTexts, Writing } from '@/lib/bench/read-texts';
import { shown } from '@/lib/bench/show';
import type { WorkedOut } from '@/lib/bench/work-out';
import { newId } from '@/lib/ids';
import { stamp } from '@/lib/offline/clock';
import { ApiProblem } from '@/lib/query/problem';

/** The check of a case that a sum is to answer. */
export interface CaseTarget {
  caseId: string;
  caseName: string;
  checkId: string;
  checkName: string;
  /** The output that the check takes. */
  output: string;
  /** What stands there now, to be replaced. */
  standing: string | null;
  /** Whether the case still takes answers. */
  open: boolean;
  reader: { personId: string; organisationId: string };
}

interface Props {
  sum: Sum;
  worked: WorkedOut;
  target: CaseTarget;
  writing: Writing;
  /** What was typed: the server works it out anew. */
  texts: SumTexts;
}

/** Writes the result into the case, with all that went in; what stood there stays in the case's history. */
export function IntoCase({ sum, worked, target, writing, texts }: Props) {
  const client = useQueryClient();
  const router = useRouter();
  const [pending, setPending] = useState(false);
  const [problem, setProblem] = useState<ApiProblem | null>(null);
  const output = sum.outputs.find(({ id }) => id === target.output);
  const value = worked.kind === 'values' ? worked.values[target.output] : undefined;
  const path = `/cases/${target.caseId}`;

  async function write() {
    setPending(true);
    setProblem(null);
    const id = newId();
    const inputs = Object.fromEntries(sum.inputs.map((input) => [input.id, texts[input.id] ?? {}]));
    try {
      await keepAndSend(
        client,
        { ...target.reader, caseId: target.caseId, refusal: null, kind: 'finding', id, body: { id, checkId: target.checkId, answer: { kind: 'sum', sum: sum.id, inputs, sureness: 'sure' }, askedBecause: 'choice', ...stamp() } },
        `/api/v1${path}/findings`,
      );
      router.push(path);
    } catch (error) {
      setPending(false);
      setProblem(error instanceof ApiProblem ? error : new ApiProblem('This could not be written into the case. Your readings are still here.', 0));
    }
  }

  if (!target.open) return <Notice title={`${target.checkName}, ${target.caseName}`}>The case has been called. Reopen it to write into it.</Notice>;
  return (
    <section aria-labelledby="into-case" className="grid gap-3 border-t border-rule pt-4">
      <h2 id="into-case" className="text-[1.25rem]">{target.checkName}, {target.caseName}</h2>
      <p className="max-w-prose">
        {output && value !== undefined ? <>The case takes <b className="figure font-normal">{shown(value, output, writing)}</b>, with its doubt and all that went in.</> : 'There is no result for the case to take yet.'}
        {target.standing && <> It replaces <b className="figure font-normal">{target.standing}</b>, which stays in the history.</>}
      </p>
      {problem && (
        <Notice kind="danger" title={problem.message} actions={'cautions' in problem.fields ? <Button variant="quiet" onClick={() => router.push(path)}>To the case</Button> : undefined}>
          {Object.entries(problem.fields).filter(([field]) => field !== 'cautions').map(([, text]) => text).join(' ')}
        </Notice>
      )}
      <Button className="min-h-14!" aria-disabled={pending || value === undefined || undefined} onClick={() => !pending && value !== undefined && void write()}>
        {pending ? 'Saving…' : 'Write it into the case'}
      </Button>
    </section>
  );
}
