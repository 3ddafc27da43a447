import { compileRulebook } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import type { FindingRow } from '@/lib/case/rows';
import type { DossierParts, LeftOut } from '@/lib/dossier/content';
import { METRIC_UNITS } from '@/lib/units';

const AT = new Date('2026-03-02T15:10:00Z');
export const NOTHING_OUT: LeftOut = { sections: [], photoIds: [], names: false, fleet: false };

export function finding(more: Partial<FindingRow> = {}): FindingRow {
  return {
    id: '01', checkId: 'build-up-time', stage: { kind: 'diagnosis' }, source: 'asked', askedBecause: 'choice', kind: 'measured', shares: [], reliability: 1,
    valueTyped: '48', errorTyped: '1', unit: 's', valueSi: 48, errorSi: 1, sum: null,
    judgement: { limit: { id: 'l', checkId: 'build-up-time', least: null, most: 25, below: false, source: 'Our own rule 7' }, verdict: 'out', doubtful: false },
    baseline: null, person: 'Ada', correctedAt: AT, receivedAt: AT, late: false, ...more,
  };
}

export function parts(more: Partial<DossierParts> = {}): DossierParts {
  return {
    about: { reference: 'D-2026-00012', organisation: 'Northern Haulage', caseNumber: 7, madeAt: AT, madeBy: 'Cy', timeZone: 'America/Chicago' },
    units: METRIC_UNITS,
    unit: {
      unit: { fleetNumber: 'K-104', vehicleKind: 'truck', vocation: null, builtOn: '2019-05-06', engineFamily: null, reservoirM3: null, dryerCartridgeChangedOn: null },
      siteName: 'Yard', odometerM: 659_831_040, engineS: null, model: null,
    },
    fits: [],
    complaint: { complaints: ['Oil at the dryer'], words: 'It spits', openedAt: AT, openedBy: 'Ada' },
    findings: { compiled: compileRulebook(defaultRulebook), standing: [finding()], notes: [{ id: 'n', findingId: '01', text: 'Cold engine', person: 'Ada', at: AT }] },
    photos: [
      { id: '01890a5d-ac96-774b-bcce-b302099a8057', description: 'Drain', checkName: 'Drain line', width: 4, height: 3, strokes: [], takenAt: AT, person: 'Bo', objectKey: 'k1' },
      { id: '01890a5d-ac96-774b-bcce-b302099a8058', description: null, checkName: null, width: 4, height: 3, strokes: [], takenAt: AT, person: 'Ada', objectKey: 'k2' },
    ],
    ranking: { at: AT, isOfCall: true, editionNumber: 1, causes: [{ name: 'Drain choked', p: 0.62, reasons: [{ finding: 'Drain: heavy bead', direction: 'for', strength: 'strongly', note: 'Sealant squeezes in.' }] }, { name: 'Worn rings', p: 0.38, reasons: [] }] },
    call: { mainCause: 'Drain choked', contributingCauses: [], sureness: 'fairly-sure', proof: 'none', whyNotLeading: null, unlistedCause: null, person: 'Bo', at: AT },
    repairs: [{ name: 'Clear the drain', whyBefore: null, chosenAt: AT, chosenBy: 'Bo', endedAt: null, endedBy: null, outcome: null, whyDropped: null, steps: [{ text: 'Open it.', mark: { mark: 'done', value: '30 lb·ft', note: null, by: 'Bo', at: AT } }, { text: 'Look through it.', mark: null }] }],
    installs: [{ modelName: 'Field 16', installedOn: '2026-03-01', finishedAt: AT, points: [{ name: 'Sealant', said: { label: 'A bead', against: true, value: null, note: 'none other at hand', by: 'Bo', at: AT } }, { name: 'Governor', said: null }] }],
    breakIns: [{
      run: { startedAt: AT.getTime(), endedAt: AT.getTime() + 1_500_000, events: [{ id: 'r', kind: 'reading', at: AT.getTime() + 600_000, pressurePa: 550_000 }] },
      startedBy: 'Bo', outcome: 'done', whyStopped: null, hotCheck: { oil: 'none', coolant: 'none', where: null },
      figures: { engineRpm: 1000, pressure: { aim: 551_581, low: 517_107, high: 586_054 }, duration: { least: 1200, most: 1800 }, from: 'edition', source: 'Common practice, no source.' },
    }],
    releases: [{ releasedAt: AT, releasedBy: 'Cy', basis: 'Inspector since 2019', note: null, on: [{ name: 'Governor cut-out', answer: '8.8 bar' }] }],
    watches: [{ cause: 'Drain choked', plan: 'Oil at the dryer', startedAt: AT, begin: [{ statement: 'The tanks are clean.', said: 'Yes' }], readings: [{ check: 'Oil at the purge', answer: 'A film', isInOrder: true, by: 'Bo', at: AT }], endedAt: AT, outcome: 'held', why: null, proof: 'held-with-others' }],
    ...more,
  };
}
