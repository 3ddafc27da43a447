import { readMeasure } from '@/lib/services/units-of-measure';
import { DAYS_OF_RECORD } from './calendar';
import { WRITING } from './organisation';
import type { Random } from './random';
import type { Vehicle } from './vehicles';

const MILES_ON_A_NEW_ODOMETER = 3;

/** Odometer and engine hours of a vehicle as somebody types them, and what that is in SI. */
export interface Readings {
  odometerM: number;
  engineS: number;
  asTyped: { odometerM: string; engineS: string };
}

/** How far a vehicle has run by each day: steady before the record, with good and bad months within it. */
export class Mileage {
  private readonly miles = new Float64Array(DAYS_OF_RECORD + 1);

  constructor(
    random: Random,
    private readonly vehicle: Vehicle,
  ) {
    const { builtDay, milesPerDay } = vehicle;
    let month = 1;
    let total = milesPerDay * Math.max(0, -builtDay);
    for (let day = 0; day <= DAYS_OF_RECORD; day += 1) {
      this.miles[day] = total;
      if (day % 30 === 0) month = random.between(0.75, 1.25);
      if (day >= builtDay) total += milesPerDay * month * random.between(0.5, 1.5);
    }
  }

  /** Miles that it has run since it was built, at the start of a day. */
  milesAt(day: number): number {
    if (day >= 0) return this.miles[Math.min(day, DAYS_OF_RECORD)] ?? 0;
    return Math.max(0, (this.miles[0] ?? 0) + this.vehicle.milesPerDay * day);
  }

  hoursAt(day: number): number {
    return this.milesAt(day) / this.vehicle.milesPerHour;
  }

  isOdometerNew(day: number): boolean {
    return this.vehicle.odometerReplacedOn === day;
  }

  /** What the instruments show. */
  readings(day: number): Readings {
    const { odometerReplacedOn } = this.vehicle;
    const since = odometerReplacedOn !== undefined && day >= odometerReplacedOn ? this.milesAt(odometerReplacedOn) - MILES_ON_A_NEW_ODOMETER : 0;
    const odometer = typed(this.milesAt(day) - since, 'distance');
    const engine = typed(this.hoursAt(day), 'engineHours');
    return { odometerM: odometer.si, engineS: engine.si, asTyped: { odometerM: odometer.asTyped, engineS: engine.asTyped } };
  }
}

function typed(value: number, quantity: 'distance' | 'engineHours') {
  const read = readMeasure(WRITING, Math.floor(value).toLocaleString('en-US'), { quantity });
  if (!read.ok) throw new Error(read.message);
  return read;
}
