/** What a row of the audit did, by the name of the service that wrote it. A test holds every write to have its words. */
export const ACTION_WORDS: Readonly<Record<string, string>> = {
  'accept.invitation': 'Accepted an invitation',
  'acknowledge.caution': 'Acknowledged a caution',
  'add.photo': 'Added a photo',
  'add.site': 'Added a site',
  'add.unit-reading': 'Added a reading of a unit',
  'adopt.limit': 'Adopted a limit',
  'answer.install-point': 'Answered a point of an install record',
  'assign.case': 'Gave a case to somebody',
  'call.case': 'Called a case',
  'change-password.person': 'Changed their own password',
  'change.compressor-model': 'Changed a compressor model',
  'change.fit': 'Changed a fit',
  'change.membership': 'Changed what somebody may do',
  'change.organisation': 'Changed the organisation',
  'change.site': 'Changed a site',
  'change.unit': 'Changed a unit',
  'choose.repair': 'Chose a repair',
  'create.api-token': 'Made a token',
  'create.compressor-model': 'Added a compressor model',
  'create.fit': 'Recorded a fit',
  'create.unit': 'Added a unit',
  'end.break-in': 'Ended a break-in run',
  'end.membership': 'Ended a membership',
  'add.watch-reading': 'Read what is watched',
  'create.watch-link': 'Gave out a link for a reading',
  'end.watch': 'Ended a watch',
  'revoke.watch-link': 'Took a link for a reading back',
  'start.watch': 'Began to watch a repair',
  'take-back.watch-reading': 'Took a reading of a watch back',
  'end.oil-catch': 'Took the bottle down',
  'end.repair': 'Finished a repair, or dropped it',
  'finish.fitting': 'Finished a fitting',
  'file.claim': 'Kept that something was claimed',
  'hide.baseline-set': 'Hid a healthy baseline',
  'hide.compressor-model': 'Hid a compressor model',
  'hide.fit': 'Hid a fit',
  'hide.photo': 'Hid a photo, or showed it again',
  'hide.unit': 'Hid a unit',
  'invite.person': 'Invited somebody',
  'lift.unit-hold': 'Lifted “do not release”',
  'look-hot.break-in': 'Looked for leaks after a break-in run',
  'mail.invitation': 'Mailed an invitation',
  'mail.notice': 'Mailed somebody the notices of a day',
  'mail.oil-catch': 'Reminded somebody to weigh oil',
  'remind.watch': 'Reminded somebody of a watch',
  'make-again.dossier': 'Asked for the PDF of a dossier again',
  'make.gate': 'Made a gate',
  'pass.gate': 'Passed a gate',
  'make.dossier': 'Made a dossier',
  'make.dossier-pdf': 'Made the PDF of a dossier',
  'make.thumbnail': 'Made the small picture of a photo',
  'mark.photo': 'Drew on a photo or described it',
  'mark.repair-step': 'Said what was done of a step',
  'note.break-in': 'Noted something of a break-in run',
  'note.finding': 'Noted something at an answer',
  'open.case': 'Opened a case',
  'plan.repair': 'Planned a repair',
  'read-all.notice': 'Read all their notices',
  'read.notice': 'Read a notice',
  'record.baseline-set': 'Measured a healthy baseline',
  'record.finding': 'Answered a check',
  'release.unit': 'Released a unit',
  'remind.oil-catch': 'Changed a reminder to weigh oil',
  'remove.saved_view': 'Removed a view of a list',
  'rename.person': 'Changed their own name',
  'rename.saved_view': 'Renamed a view of a list',
  'reopen.case': 'Opened a case again',
  'resend.invitation': 'Sent an invitation again',
  'reset-password.person': 'Chose a new password by mail',
  'retry.job': 'Tried a job again that had failed',
  'revoke.gate': 'Revoked a gate',
  'revoke.api-token': 'Revoked a token',
  'save.saved_view': 'Saved a view of a list',
  'set-notices.person': 'Chose how they are told of things',
  'set-units.person': 'Chose their units of measure',
  'settle.claim': 'Said what came of a claim',
  'settle.core-credit': 'Said what came of a core',
  'show.compressor-model': 'Showed a hidden compressor model again',
  'show.unit': 'Showed a hidden unit again',
  'send-again.dossier': 'Tried again to send a dossier',
  'send.core-credit': 'Kept that a core went back',
  'send.dossier': 'Sent a dossier',
  'sign-out-everywhere.person': 'Signed out everywhere',
  'start.break-in': 'Began a break-in run',
  'start.fitting': 'Began to fit a compressor',
  'start.oil-catch': 'Began to catch oil',
  'store.photo': 'Sent a photo’s file',
  'strike.unit-reading': 'Struck out a reading of a unit',
  'take-back.oil-weighing': 'Took a weighing of oil back',
  'take-out.fit': 'Took a compressor out',
  'weigh.oil-catch': 'Weighed oil',
  'withdraw.invitation': 'Withdrew an invitation',
  'withdraw.limit': 'Withdrew a limit',
};

/** The kinds of things that are written, as one picks among them. */
export const ENTITY_WORDS: Readonly<Record<string, string>> = {
  'api-token': 'Tokens',
  'baseline-set': 'Healthy baselines',
  break_in_run: 'Break-in runs',
  call: 'Calls',
  case: 'Cases',
  caution_acknowledgement: 'Cautions acknowledged',
  claim: 'Claims',
  'compressor-model': 'Compressor models',
  'core-credit': 'Core credits',
  dossier: 'Dossiers',
  finding: 'Answers',
  finding_note: 'Notes at answers',
  fit: 'Fits',
  fitting: 'Fittings',
  invitation: 'Invitations',
  job: 'Jobs',
  limit: 'Limits',
  membership: 'Memberships',
  notice: 'Notices',
  'oil-catch': 'Oil caught',
  watch: 'Watches',
  'watch-link': 'Links for a reading',
  'oil-weighing': 'Weighings of oil',
  organisation: 'Organisation',
  person: 'People',
  photo: 'Photos',
  repair: 'Repairs',
  saved_view: 'Views of lists',
  gate: 'Gates',
  site: 'Sites',
  unit: 'Units',
  'unit-reading': 'Readings of units',
};

/** "strike.unit-reading": a name that has no words yet is at least made of some. */
const plainly = (name: string): string => {
  const words = name.replaceAll(/[._-]/g, ' ');
  return words.charAt(0).toUpperCase() + words.slice(1);
};

export const actionWords = (action: string): string => ACTION_WORDS[action] ?? plainly(action);
export const entityWords = (entity: string): string => ENTITY_WORDS[entity] ?? plainly(entity);

interface Written {
  entity: string;
  entityId: string;
  changed: Record<string, unknown>;
}

/** The page of the thing that a row is about; nothing where it has none. */
export function subjectOf({ entity, entityId, changed }: Written): { href: string; label: string } | null {
  if (entity === 'case' || entity === 'caution_acknowledgement') return { href: `/cases/${entityId}`, label: 'The case' };
  if (typeof changed.caseId === 'string') return { href: `/cases/${changed.caseId}`, label: 'The case' };
  if (entity === 'unit') return { href: `/units/${entityId}`, label: 'The unit' };
  if (entity === 'fit' && typeof changed.unitId === 'string') return { href: `/units/${changed.unitId}/fits/${entityId}`, label: 'The fit' };
  if ((entity === 'unit-reading' || entity === 'baseline-set') && typeof changed.unitId === 'string') return { href: `/units/${changed.unitId}`, label: 'The unit' };
  if (entity === 'compressor-model') return { href: `/models/${entityId}`, label: 'The model' };
  if (entity === 'limit' && changed.withdrawn !== true) return { href: `/settings/limits/${entityId}`, label: 'The limit' };
  if (entity === 'site') return { href: `/settings/sites/${entityId}`, label: 'The site' };
  if (entity === 'membership') return { href: `/settings/people/${entityId}`, label: 'The person' };
  return null;
}
