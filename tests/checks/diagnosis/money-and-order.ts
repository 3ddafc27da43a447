import { expectedSaving, leastCost } from '@/lib/diagnose/evsi';
import { forecast } from '@/lib/diagnose/information';
import { expectedRepairCost, type RepairProblem } from '@/lib/diagnose/repair-order-costs';
import { repairOrder } from '@/lib/diagnose/repair-order';
import { findOrder } from '@/lib/diagnose/repair-order-search';
import type { Proofs } from '../../support/outside-values';

/** The oil wildcatter: dry, wet, soaking; drill or don't; thousands of dollars. A gain is a negative cost. */
const hole = [0.5, 0.3, 0.2];
const wildcatter = [[70, -50, -200], [0, 0, 0]];
const seismic = forecast(hole, [[0.6, 0.3, 0.1], [0.3, 0.4, 0.4], [0.1, 0.3, 0.5]]);
const tellsAll = forecast(hole, [[1, 0, 0], [0, 1, 0], [0, 0, 1]]);

/** The used car: good or bad; bought for 1,500 and worth 2,000, a bad one needing 700 of repairs. */
const car = [0.7, 0.3];
const buying = [[-500, 200], [0, 0]];
const carTest = forecast(car, [[0.8, 0.35], [0.2, 0.65]]);

/** Actions that each remove one cause; whatever has none costs `service`. */
function problem(looks: number[], fixes: number[], causes: number, service: number): RepairProblem {
  return {
    causeIds: Array.from({ length: causes }, (_, c) => `cause-${c}`),
    actions: looks.map((look, a) => ({
      remedyId: `action-${a}`, removes: [a], lookCost: look, fixCost: fixes[a] ?? 0, comebackCost: 0, onReaching: look, onRemoving: fixes[a] ?? 0,
    })),
    left: new Float64Array(causes).fill(service),
  };
}

/** Weights 10 and 2, times 1 and 3: a job's weight is its chance, once divided by their sum. */
const jobs = problem([1, 3], [0, 0], 2, 100);
const weights = [10 / 12, 2 / 12];

const breakdown = problem([30, 10], [500, 80], 2, 1e6);
const five = problem([40, 10, 25, 5, 60], [120, 60, 200, 15, 30], 6, 400);
const fiveChances = [0.35, 0.25, 0.2, 0.1, 0.05, 0.05];

export const moneyAndOrder: Proofs = {
  V01: () => -leastCost(hole, wildcatter),
  V02: () => -leastCost(hole, wildcatter) + expectedSaving(hole, seismic, wildcatter) - 10,
  V04: () => expectedSaving(hole, tellsAll, wildcatter),
  V05: () => carTest.chances[0] ?? NaN,
  V06: () => carTest.posteriors[0]?.[0] ?? NaN,
  V08: () => -leastCost(car, buying),
  V09: () => expectedSaving(car, carTest, buying),
  V10: () => carTest.bits,
  E01: () => 12 * expectedRepairCost(jobs, weights, findOrder(jobs, weights).order),
  E03: () => repairOrder(jobs, weights).expectedCost,
  E04: () => expectedRepairCost(jobs, weights, [...findOrder(jobs, weights).order].reverse()),
  E05: () => expectedRepairCost(breakdown, [0.6, 0.4], [0, 1]) - expectedRepairCost(breakdown, [0.6, 0.4], [1, 0]),
  E07: () => repairOrder(five, fiveChances).expectedCost,
};
