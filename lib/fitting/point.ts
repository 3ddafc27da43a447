/** What a fit's record keeps of how it was fitted: a column of `fit`. */
export type Fact = 'sealant' | 'dischargeLine' | 'governor' | 'feedLine' | 'intakeHose' | 'dryerCartridge' | 'driveGear' | 'systemCleaned';

/** What of the compressor model decides whether something is asked; null: the model's record doesn't say. */
export interface ModelFacts {
  driveGear: string | null;
  cooling: string | null;
}

/** Asked only for models of which the record says one of these. */
type OnlyFor = { readonly [Name in keyof ModelFacts]?: readonly (string | null)[] };

export interface InstallOption {
  readonly id: string;
  readonly label: string;
  /** What has to be written with it. */
  readonly asks?: 'note' | 'value' | 'value-and-note';
  /** Known to shorten a compressor's life: it is said so, and why it was done all the same is asked. */
  readonly against?: true;
  readonly practice?: { readonly field: Fact; readonly value: string };
  readonly onlyFor?: OnlyFor;
}

export const INSTALL_GROUPS = { before: 'Before it goes on', mounting: 'At the mount', drive: 'Drive', 'oil-feed': 'Oil feed', air: 'Air line', intake: 'Intake', coolant: 'Coolant', core: 'The old one' } as const;

export interface InstallPoint {
  readonly id: string;
  readonly group: keyof typeof INSTALL_GROUPS;
  readonly name: string;
  readonly prompt: string;
  readonly why: string;
  readonly answers: readonly InstallOption[];
  /** It is shown, not only said. */
  readonly photo?: true;
  readonly valueHint?: string;
  readonly noteHint?: string;
  readonly onlyFor?: OnlyFor;
}
