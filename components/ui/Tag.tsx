import type { ReactNode } from 'react';
import { classes } from './classes';

export type TagTone = 'plain' | 'evidence' | 'strong' | 'danger';

const tones: Record<TagTone, string> = {
  plain: 'border-edge text-ink',
  evidence: 'figure unit border-oil text-oil-ink',
  strong: 'border-ink bg-ink text-paper',
  danger: 'border-danger text-danger',
};

/**
 * A short state or kind, as a stamped label: "open", "held with others", "do not release". Its word says it all.
 * `evidence` is for a weight, such as "+6 dB", and keeps its case.
 * @example <Tag tone="danger">Do not release</Tag>
 */
export function Tag({ tone = 'plain', children }: { tone?: TagTone; children: ReactNode }) {
  return <span className={classes('label inline-block justify-self-start rounded border px-1.5 py-px text-[0.8125rem] whitespace-nowrap', tones[tone])}>{children}</span>;
}
