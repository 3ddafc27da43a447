import type { ReactNode } from 'react';
import { WorkCautions } from '@/components/case/WorkCautions';

interface Props {
  repair: { cautions: readonly { id: string; text: string }[]; toRead: readonly string[] };
  /** By which the reader says that they were read; null: he or she doesn't work on cases. */
  read: ReactNode;
}

/** The cautions of a repair, before its steps. */
export const RepairCautions = ({ repair: { cautions, toRead }, read }: Props) => <WorkCautions {...{ cautions, toRead, read }} behind="What is done" />;
