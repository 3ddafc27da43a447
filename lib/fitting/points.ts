import type { Fact, InstallPoint } from './point';

const YES_NO_DONE = [
  { id: 'yes', label: 'Yes' },
  { id: 'no', label: 'No', asks: 'note', against: true },
] as const;

const CHANGED_OR_KEPT = (field: Fact) =>
  [
    { id: 'changed', label: 'Changed', practice: { field, value: 'changed' } },
    { id: 'kept', label: 'Kept', asks: 'note', practice: { field, value: 'kept' } },
  ] as const;

/**
 * Every point that decides whether a new compressor lives, in the order of the work. Common practice, no source; a torque and
 * any other value is the maker's, and is asked for, never given.
 */
export const INSTALL_POINTS: readonly InstallPoint[] = [
  { id: 'source-removed', group: 'before', name: 'Source of the contamination', prompt: 'Is what ruined the last one found and removed?', why: 'A new compressor on the old cause goes the same way.', answers: [{ id: 'yes', label: 'Yes', asks: 'note' }, { id: 'no', label: 'No, or nobody knows', asks: 'note', against: true }] },
  {
    id: 'old-oil-drained', group: 'before', name: 'Old oil', prompt: 'Are tanks and line drained of old oil and cleaned?', why: 'Oil that is already downstream keeps appearing for weeks and hides whether the repair holds.',
    answers: [{ id: 'yes', label: 'Yes', practice: { field: 'systemCleaned', value: 'yes' } }, { id: 'no', label: 'No', asks: 'note', against: true, practice: { field: 'systemCleaned', value: 'no' } }],
  },
  { id: 'gasket-face', group: 'mounting', name: 'Gasket faces', prompt: 'Are both faces clean to the metal, with nothing fallen into the engine?', why: 'Old gasket and sealant leave a leak, or close the drain.', answers: YES_NO_DONE },
  { id: 'drain-hole', group: 'mounting', name: 'Oil drain', prompt: 'Is the drain seen clear over its whole width, with the gasket held against it?', why: 'Where oil can’t fall back, the crankcase fills and the piston pumps oil from the first minute.', answers: YES_NO_DONE },
  {
    id: 'sealant', group: 'mounting', name: 'Sealant', prompt: 'What holds the gasket?', why: 'Only enough to hold it. A bead squeezes into the drain, worst where its opening is small.',
    answers: [
      { id: 'none', label: 'Nothing', practice: { field: 'sealant', value: 'none' } },
      { id: 'thin-film', label: 'A thin film', practice: { field: 'sealant', value: 'thin-film' } },
      { id: 'spray-adhesive', label: 'Spray adhesive', practice: { field: 'sealant', value: 'spray-adhesive' } },
      { id: 'heavy-bead', label: 'A bead', against: true, asks: 'note', practice: { field: 'sealant', value: 'heavy-bead' } },
    ],
  },
  { id: 'seen-before-closing', group: 'mounting', name: 'Photograph before it is closed', prompt: 'Are face, gasket and drain photographed before they are closed?', why: 'It can’t be seen again without taking it off, and a supplier asks for it.', photo: true, answers: YES_NO_DONE },
  { id: 'torque', group: 'mounting', name: 'Tightening', prompt: 'Tightened to the maker’s values, in the maker’s order?', why: 'A flange pulled crooked leaks, and may close the drain.', answers: [{ id: 'yes', label: 'Yes', asks: 'value' }, { id: 'no', label: 'No', asks: 'note', against: true }], valueHint: 'The value, and where you have it from' },
  {
    id: 'drive-gear', group: 'drive', name: 'Drive gear', prompt: 'Which gear is on it?', why: 'Steel may be used again when every tooth is sound. A fibre gear never: its rim lets go of its hub.',
    answers: [
      { id: 'new', label: 'A new gear', practice: { field: 'driveGear', value: 'changed' } },
      { id: 'steel-reused', label: 'The steel gear, inspected and sound', onlyFor: { driveGear: ['steel', null] }, practice: { field: 'driveGear', value: 'kept' } },
      { id: 'fibre-reused', label: 'The fibre gear again', against: true, asks: 'note', onlyFor: { driveGear: ['fibre', null] }, practice: { field: 'driveGear', value: 'kept' } },
    ],
  },
  { id: 'timing-mark', group: 'drive', name: 'Timing mark', prompt: 'Is it set where this engine needs it?', why: 'On some engines the compressor’s turn is timed to the engine’s.', answers: [{ id: 'yes', label: 'Set' }, { id: 'not-needed', label: 'This engine needs none' }, { id: 'no', label: 'No', asks: 'note', against: true }] },
  {
    id: 'feed-line', group: 'oil-feed', name: 'Oil feed line', prompt: 'Is the feed line changed, or looked through and sound?', why: 'A starved bearing fails in hours.',
    answers: [{ id: 'changed', label: 'Changed', practice: { field: 'feedLine', value: 'changed' } }, { id: 'looked-through', label: 'Kept: looked through, sound', asks: 'note', practice: { field: 'feedLine', value: 'kept' } }],
  },
  { id: 'pre-filled', group: 'oil-feed', name: 'Filled before the first turn', prompt: 'Is it filled with clean oil before the first turn?', why: 'The first seconds are otherwise dry.', answers: YES_NO_DONE },
  { id: 'oil-returns', group: 'oil-feed', name: 'Oil seen to return', prompt: 'Is oil seen to return before it works under load?', why: 'It proves feed and drain at once.', answers: YES_NO_DONE },
  {
    id: 'discharge-line', group: 'air', name: 'Discharge line', prompt: 'Is the discharge line changed?', why: 'An old line is often half closed by carbon and still passes air at low flow. The new compressor then cooks.',
    answers: [{ id: 'changed', label: 'Changed', practice: { field: 'dischargeLine', value: 'changed' } }, { id: 'kept', label: 'Kept: its bore is measured', asks: 'value-and-note', practice: { field: 'dischargeLine', value: 'kept' } }],
    valueHint: 'The bore you measured at the head fitting', noteHint: 'Why it stays',
  },
  { id: 'line-falls', group: 'air', name: 'Fall of the line', prompt: 'Does it fall all the way to the dryer, without a low spot?', why: 'Water and oil stand in a low spot, and freeze there.', answers: YES_NO_DONE },
  { id: 'safety-valve', group: 'air', name: 'Safety valve', prompt: 'Where is the safety valve before the dryer?', why: 'With the line closed nothing else limits the pressure at the head. It is never gagged.', answers: [{ id: 'head', label: 'On the head' }, { id: 'line', label: 'In the line near the head' }, { id: 'none', label: 'There is none', asks: 'note', against: true }] },
  { id: 'governor', group: 'air', name: 'Governor', prompt: 'Is the governor changed?', why: 'Common practice with every compressor.', answers: CHANGED_OR_KEPT('governor') },
  { id: 'dryer-cartridge', group: 'air', name: 'Dryer cartridge', prompt: 'Is the dryer cartridge changed?', why: 'An old one is full of old oil: the watch would read it as new.', answers: CHANGED_OR_KEPT('dryerCartridge') },
  { id: 'intake-gasket', group: 'intake', name: 'Intake gasket and box', prompt: 'Is the intake gasket new, on a clean face, with a clean box?', why: 'Dust past the filter scores the bore.', answers: YES_NO_DONE },
  { id: 'intake-hose', group: 'intake', name: 'Intake hose', prompt: 'Is the intake hose changed?', why: 'A soft hose closes under load and draws oil up past the rings.', answers: [{ id: 'changed', label: 'Changed', practice: { field: 'intakeHose', value: 'changed' } }, { id: 'kept', label: 'Kept: firm and tight', practice: { field: 'intakeHose', value: 'kept' } }] },
  { id: 'coolant-bled', group: 'coolant', name: 'Coolant', prompt: 'Are the coolant lines filled and bled?', why: 'Air in the head overheats it while the gauge looks right.', onlyFor: { cooling: ['coolant', null] }, answers: [{ id: 'yes', label: 'Yes' }, { id: 'air-cooled', label: 'It is cooled by air', onlyFor: { cooling: [null] } }, { id: 'no', label: 'No', asks: 'note', against: true }] },
  { id: 'old-unit', group: 'core', name: 'The old compressor', prompt: 'Is the old compressor photographed as it came off?', why: 'The core goes back to a supplier, and its look is the proof of what failed.', photo: true, answers: YES_NO_DONE },
];
