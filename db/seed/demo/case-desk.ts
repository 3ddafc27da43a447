import { findingsFromRecord, type CompiledCheck, type Finding, type Ranking, type RecordFacts } from '@/lib/diagnose';
import { cautionsToRead, dangersOf } from '@/lib/diagnose/cautions';
import { AS_PARKED, stateAfter, type VehicleState } from '@/lib/diagnose/set-up';
import { newId } from '@/lib/ids';
import type { answerInput } from '@/lib/schemas/case';
import { complaintFindings } from '@/lib/services/case/complaints';
import { currentFindings, slotOf } from '@/lib/case/current-findings';
import { findingsForRanking } from '@/lib/case/findings-for-ranking';
import { readAnswer } from '@/lib/case/read-answer';
import { releaseHolds } from '@/lib/case/release-holds';
import type { z } from 'zod';
import { seededId } from '../seeded-id';
import { audited, type AuditEntry } from './audit-row';
import type { WorkClock } from './calendar';
import { demoLimits } from './limit-rows';
import type { Mileage } from './mileage';
import { ORGANISATION, WRITING, type DemoPerson } from './organisation';
import type { Random } from './random';
import type { Row } from './rows';
import { makeRun } from './run-row';
import type { Vehicle } from './vehicles';
import type { World } from './world';

const organisationId = ORGANISATION.id;
const WRITES = { units: WRITING.person.units, decimal: '.' as const };
const DIAGNOSIS = { kind: 'diagnosis' as const };

export interface Opening {
  vehicle: Vehicle;
  fitId: string | null;
  /** What the record knows, as the service gathers it when a case is opened. */
  recordFacts: RecordFacts;
  complaints: string[];
  complaintWords: string | null;
  /** Readings typed in with the case; null when nobody did. */
  mileage: Mileage | null;
  by: DemoPerson;
}

export type Answer = z.output<typeof answerInput>;
export type AskedBecause = 'suggested' | 'always' | 'random' | 'choice' | 'panel';

/**
 * Writes down a case as the services do (lib/services/case): the same rows, beside each the same audit row, after each
 * answer a run. What the services take from the clock and from chance comes from the demo's.
 */
export class CaseDesk {
  readonly id: string;
  readonly openedAt: Date;
  ranking: Ranking;
  vehicleState: VehicleState = AS_PARKED;
  status: 'open' | 'called' | 'closed' = 'open';
  private closedAt: Date | null = null;
  private assignedTo: string;
  private version = 1;
  private readonly findings: Row<'finding'>[] = [];
  private readonly read: { personId: string; onDay: string; cautionId: string; dangers: string[] }[] = [];
  private lastReceived: Date;
  private offlineUntil: Date | null = null;
  private lastRunId = '';
  private lastCallId: string | null = null;
  private readonly readings;
  private readonly limits;

  constructor(
    private readonly world: World,
    readonly clock: WorkClock,
    private readonly random: Random,
    private readonly opening: Opening,
  ) {
    const { by, vehicle, complaints, mileage, recordFacts } = opening;
    const at = (this.openedAt = this.lastReceived = clock.now());
    this.id = this.newId(at);
    this.assignedTo = by.id;

    this.limits = demoLimits(vehicle, world.calendar);
    this.readings = mileage?.readings(clock.day) ?? null;
    if (this.readings) this.noteReading(vehicle.id, this.readings, at);
    const asked = { organisationId, caseId: this.id, kind: 'state', askedBecause: 'always', personId: by.id, deviceAt: at, clockOffsetMs: 0, correctedAt: at, receivedAt: at };
    const row = (finding: Omit<Finding, 'id'>, source: string) => ({ ...finding, ...asked, id: this.newId(at), source });
    this.findings.push(
      ...findingsFromRecord(world.compiled, recordFacts).map(({ id: _, ...finding }) => row(finding, 'record')),
      ...complaintFindings(complaints).map((finding) => row(finding, 'asked')),
    );
    this.event('opened', by, at);
    this.ranking = this.run(null, at);
  }

  /** Checks that have a current answer, one that says nothing included. */
  get dealtWith(): Set<string> {
    return new Set(findingsForRanking(this.findings).map(({ checkId }) => checkId));
  }

  /** Checks that the current answers have spoiled. */
  get spoiled(): Set<string> {
    const said = findingsForRanking(this.findings).filter(({ shares }) => shares.length > 0);
    return new Set(said.flatMap(({ checkId }) => this.world.compiled.checks.get(checkId)?.check.spoils ?? []));
  }

  /** From now until then answers stay on the device. */
  goOffline(minutes: number): void {
    this.offlineUntil = new Date(this.clock.now().getTime() + minutes * 60_000);
  }

  /** As `recordFinding`. Returns the finding's id. */
  answer(check: CompiledCheck, answer: Answer, by: DemoPerson, askedBecause: AskedBecause): string {
    const correctedAt = this.clock.now();
    return this.record(check, answer, by, askedBecause, correctedAt, this.receivedAt(correctedAt));
  }

  /** An answer that was given before the one that stands, on a device that has only now found its way back. */
  answerLate(check: CompiledCheck, answer: Answer, by: DemoPerson): void {
    const standing = currentFindings(this.findings).find(({ checkId }) => checkId === check.id);
    if (!standing) return;
    const before = new Date(Math.max(this.openedAt.getTime() + 500, standing.correctedAt.getTime() - this.random.whole(30_000, 400_000)));
    if (before < standing.correctedAt) this.record(check, answer, by, 'choice', before, this.receivedAt(this.clock.now()));
  }

  note(findingId: string, text: string, by: DemoPerson): void {
    const createdAt = this.receivedAt(this.clock.now());
    const id = this.newId(createdAt);
    this.world.rows.findingNote.push({ organisationId, id, findingId, caseId: this.id, text, personId: by.id, createdAt });
    this.audit(createdAt, by, { action: 'note.finding', entity: 'finding_note', entityId: id, changed: { findingId, text } });
  }

  call(call: Pick<Row<'call'>, 'mainCause' | 'contributingCauses' | 'sureness' | 'proof' | 'whyNotLeading' | 'unlistedCause'>, by: DemoPerson): void {
    const at = this.receivedAt(this.clock.now());
    const id = this.newId(at);
    this.world.rows.call.push({ organisationId, id, caseId: this.id, ...call, runId: this.lastRunId, supersedes: this.lastCallId, personId: by.id, at, createdAt: at });
    this.event('called', by, at, { callId: id });
    this.lastCallId = id;
    this.status = 'called';
    this.version += 1;
    const { mainCause, contributingCauses, sureness } = call;
    this.audit(at, by, { action: 'call.case', entity: 'call', entityId: id, changed: { caseId: this.id, mainCause, contributingCauses, sureness } });
  }

  reopen(reason: string, by: DemoPerson): void {
    this.changeStatus('open', 'reopened', reason, by);
  }

  close(reason: string, by: DemoPerson): void {
    this.closedAt = this.changeStatus('closed', 'closed', reason, by);
  }

  assign(to: DemoPerson, by: DemoPerson): void {
    const at = this.receivedAt(this.clock.now());
    this.assignedTo = to.id;
    this.version += 1;
    this.event('assigned', by, at);
    this.audit(at, by, { action: 'assign.case', entity: 'case', entityId: this.id, changed: { assignedTo: to.id } });
  }

  /** Puts the case itself among the rows, as it stands at the end. Its number is given once all cases are known. */
  finish(): void {
    const { vehicle, fitId, complaints, complaintWords, by } = this.opening;
    const { odometerM = null, engineS = null, asTyped = {} } = this.readings ?? {};
    this.world.rows.finding.push(...this.findings);
    const held = releaseHolds(this.world.compiled, this.findings);
    if (this.status !== 'closed') this.hold(held);
    this.world.rows.cases.push({
      organisationId,
      id: this.id,
      number: 0,
      unitId: vehicle.id,
      siteId: vehicle.site.id,
      fitId,
      editionId: this.world.editionId,
      status: this.status,
      complaints,
      complaintWords,
      odometerM,
      engineS,
      asTyped,
      vehicleState: { ...this.vehicleState, access: [...this.vehicleState.access] },
      releaseHolds: held,
      assignedTo: this.assignedTo,
      openedBy: by.id,
      openedAt: this.openedAt,
      closedAt: this.closedAt,
      version: this.version,
      createdAt: this.openedAt,
    });
    const changed = { number: 0, unitId: vehicle.id, complaints, complaintWords, odometerM };
    this.audit(this.openedAt, by, { action: 'open.case', entity: 'case', entityId: this.id, changed });
  }

  /** What the case has found against the unit's release, unless an earlier one has. */
  private hold(checkIds: readonly string[]): void {
    const { unitHold } = this.world.rows;
    for (const checkId of checkIds) {
      const unitId = this.opening.vehicle.id;
      if (unitHold.some((other) => other.unitId === unitId && other.checkId === checkId)) continue;
      const found = this.findings.findLast((finding) => finding.checkId === checkId && finding.shares.length > 0);
      const placedAt = found?.receivedAt ?? this.openedAt;
      unitHold.push({ organisationId, id: seededId(`hold of ${this.id} by ${checkId}`), unitId, caseId: this.id, checkId, findingId: found?.id, placedAt, createdAt: placedAt });
    }
  }

  private record(check: CompiledCheck, given: Answer, by: DemoPerson, askedBecause: AskedBecause, correctedAt: Date, receivedAt: Date): string {
    const answer = readAnswer(check, given, WRITES, this.limits.get(check.id));
    const says = answer.shares.length > 0;
    if (says) this.readCautions(check, by, correctedAt);
    const id = this.newId(correctedAt);
    const slot = { checkId: check.id, stage: DIAGNOSIS };
    const standing = currentFindings(this.findings).find((other) => slotOf(other) === slotOf(slot));
    const late = standing !== undefined && standing.correctedAt > correctedAt;
    // Clocks of tablets are off by some seconds; the offset takes it out again.
    const clockOffsetMs = this.random.whole(-4000, 4000);
    this.findings.push({
      ...answer,
      ...slot,
      id,
      organisationId,
      caseId: this.id,
      source: 'asked',
      askedBecause,
      personId: by.id,
      deviceAt: new Date(correctedAt.getTime() - clockOffsetMs),
      clockOffsetMs,
      correctedAt,
      receivedAt,
      late,
      supersedes: late ? null : (standing?.id ?? null),
    });
    if (says) this.vehicleState = stateAfter(this.vehicleState, check.check.setUp);
    this.version += 1;
    this.ranking = this.run(id, receivedAt);
    const { kind, shares, valueTyped } = answer;
    this.audit(receivedAt, by, { action: 'record.finding', entity: 'finding', entityId: id, changed: { caseId: this.id, checkId: check.id, kind, shares, valueTyped } });
    return id;
  }

  private readCautions({ check }: CompiledCheck, by: DemoPerson, before: Date): void {
    const onDay = this.world.calendar.date(this.clock.day);
    const { cautions } = this.world.compiled.rulebook;
    const worseWhen = (id: string) => cautions.find((caution) => caution.id === id)?.worseWhen ?? [];
    const readToday = this.read.filter((one) => one.personId === by.id && one.onDay === onDay);
    const unread = cautionsToRead(check, worseWhen, readToday);
    if (unread.length === 0) return;
    const at = new Date(Math.max(this.openedAt.getTime() + 1, before.getTime() - this.random.whole(4000, 60_000)));
    const dangers = dangersOf(check.setUp);
    for (const cautionId of unread) {
      const row = { cautionId, personId: by.id, onDay, dangers };
      this.read.push(row);
      this.world.rows.cautionAcknowledgement.push({ ...row, organisationId, id: this.newId(at), caseId: this.id, at });
    }
    this.audit(at, by, { action: 'acknowledge.caution', entity: 'caution_acknowledgement', entityId: this.id, changed: { cautions: unread, dangers, onDay } });
  }

  private run(becauseOf: string | null, at: Date): Ranking {
    const { world, id: caseId, opening, random } = this;
    const made = makeRun(world, random, { caseId, findings: findingsForRanking(this.findings), recordFacts: opening.recordFacts, becauseOf, at });
    this.lastRunId = made.id;
    return made.ranking;
  }

  private changeStatus(status: 'open' | 'closed', kind: string, reason: string, by: DemoPerson): Date {
    const at = this.receivedAt(this.clock.now());
    this.status = status;
    this.closedAt = null;
    this.version += 1;
    this.event(kind, by, at, { reason });
    this.audit(at, by, { action: status === 'open' ? 'reopen.case' : 'close.case', entity: 'case', entityId: this.id, changed: { status, reason } });
    return at;
  }

  private event(kind: string, by: DemoPerson, at: Date, rest: { reason?: string; callId?: string } = {}): void {
    this.world.rows.caseEvent.push({ organisationId, id: this.newId(at), caseId: this.id, kind, reason: null, callId: null, ...rest, personId: by.id, at });
  }

  private noteReading(unitId: string, readings: { odometerM: number; engineS: number; asTyped: Record<string, string> }, at: Date): void {
    const row = { ...readings, unitId, readOn: this.world.calendar.date(this.clock.day), odometerReplaced: false, engineHoursReplaced: false, source: 'case', note: null };
    const id = this.newId(at);
    this.world.rows.unitReading.push({ ...row, organisationId, id, createdBy: this.opening.by.id, createdAt: at });
    this.audit(at, this.opening.by, { action: 'open.case', entity: 'unit-reading', entityId: id, changed: row });
  }

  /** When the server has it: after what it received before, and not before the device is back. */
  private receivedAt(sent: Date): Date {
    const arrives = Math.max(sent.getTime() + this.random.whole(80, 900), this.offlineUntil?.getTime() ?? 0, this.lastReceived.getTime() + this.random.whole(40, 200));
    this.lastReceived = new Date(arrives);
    return this.lastReceived;
  }

  private audit(at: Date, by: DemoPerson, entry: AuditEntry): void {
    this.world.rows.audit.push(audited(this.random, at, by.id, entry));
  }

  private newId(at: Date): string {
    return newId(at.getTime(), this.random.bytes(16));
  }
}
