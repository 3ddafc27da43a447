/** What people of the demo write in their own words. */
export const COMPLAINT_WORDS: Record<string, readonly string[]> = {
  'complaint-oil': [
    'Driver found a puddle of oil under the dryer this morning.',
    'Oil spits out at the purge in the yard.',
    'Oil when the tanks were drained at the weekly check.',
    'Black oil all over the frame behind the dryer.',
    'Milky stuff comes out of the wet tank.',
  ],
  'complaint-slow-air': ['Takes for ever to build air in the morning.', 'Driver waits at the gate for air.', 'Slow to build since the cold weather.', 'Gauge creeps up past 90.'],
  'complaint-no-air': ['No air at all, came in on the hook.', 'Gauges stay at nothing.'],
  'complaint-cycling': ['Pops off every half minute when parked.', 'Compressor never seems to rest.', 'Purge goes off all the time at idle.'],
  'complaint-noise': ['Knocks from the compressor side.', 'Whine that goes with engine speed.', 'Rattle at idle, gone when it unloads.'],
  'complaint-heat': ['Burnt smell from the line.', 'Safety valve lifted on the grade.', 'Paint on the head fitting has gone brown.'],
  'complaint-engine-oil-use': ['Uses a gallon of engine oil a week.', 'Topped up twice between services.'],
};

export const NOTES = [
  'Driver says it was the same on the last unit he had.',
  'Photo is on the shop phone.',
  'Hard to see, the bracket is in the way.',
  'Did it twice, same both times.',
  'Gauge checked against the shop gauge.',
  'Cleaned the place first, then looked again after ten minutes.',
  'Second pair of eyes agreed.',
  'Measured cold, will do it hot as well.',
  'Old paint mark still on the fitting.',
  'Not the part we keep in stock.',
  'It had rained all night, so the water may mean little.',
  'Asked the night shift as well.',
];

export const WHY_NOT_LEADING = [
  'Opened it up and saw it.',
  'I have seen this on two others of the same kind.',
  'The leading one was looked at and is in order.',
  'Had the part off: there is no doubt.',
  'It stopped as soon as this was put right.',
  'The figures fit both, but this one can be seen.',
];

export const WHY_NOT_LEADING_GUESS = ['It is nearly always this on these units.', 'Quickest to change, and we have it here.', 'The driver needs it back tonight.', 'Same as last time.'];

export const REOPENED = [
  'Oil at the purge again after {days} days.',
  'Driver brought it back after {days} days with the same trouble.',
  'Weekly check found oil again, {days} days on.',
  'It came back after {days} days: what we changed was not it.',
];

export const CLOSED = [
  'Watched for {days} days: the purge stays dry.',
  '{days} days on, nothing at the tanks at the weekly check.',
  'No complaint in {days} days.',
  'Drained at {days} days: clean.',
];

export const FIT_NOTES = ['Done on the road by a caller.', 'Flange dressed, new studs.', 'Rebuilt unit from our own bench.', 'Core kept for teardown.', 'Line flushed with it.'];
