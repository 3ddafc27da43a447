import type { Caution } from '../types';

/**
 * The hazards of the work. Each stands before the steps of every check and remedy that names it. They are written for
 * someone who is about to put a hand there, and they never stand above the maker, the site's rules or a qualified person.
 */
export const cautions: Caution[] = [
  {
    id: 'vehicle-rolls',
    text: 'A vehicle that rolls kills. Park on level ground, chock the wheels on both sides, take the key out and tag it. Chock again before you release any brake; your site’s lock-out rule comes first.',
    worseWhen: ['brakes-released'],
  },
  {
    id: 'exhaust-fumes',
    text: 'Exhaust gas kills without warning in a closed bay. For a run of 20 to 30 minutes go outdoors, or put the extraction on the exhaust before you start the engine. If you feel dull or get a headache, stop and get out.',
    worseWhen: ['engine-running'],
  },
  {
    id: 'cab-not-propped',
    text: 'A cab that isn’t locked up comes down on you. Clear the cab, tilt it the whole way and set the prop or lock as the vehicle maker says. Never reach under a cab that only its hydraulics hold.',
    worseWhen: [],
  },
  {
    id: 'pressure-falls-suspension-brakes',
    text: 'As pressure falls the air suspension drops and the spring brakes apply. Keep yourself clear of frame, wheels and brake rods, set the frame on stands where the vehicle maker says so, and warn everybody at the vehicle.',
    worseWhen: ['system-opened'],
  },
  {
    id: 'stored-air',
    text: 'Air stays where you don’t expect it. Drain every reservoir and leave its drain open; air is still trapped in the discharge line and before the dryer’s check valve. Stand to the side and crack each fitting slowly until it stops hissing.',
    worseWhen: ['system-opened'],
  },
  {
    id: 'hot-parts',
    text: 'The head, the discharge fitting and the first metres of line burn skin in an instant, and they stay hot long after the engine stops. Measure before you touch, and wear gloves made for heat.',
    worseWhen: ['engine-running'],
  },
  {
    id: 'scalding-coolant',
    text: 'Hot coolant under pressure scalds. Let the engine cool as the vehicle maker says before you open the cap or a coolant line, then open it slowly, with eyes and hands covered. Collect what runs out: it is poison.',
    worseWhen: ['engine-running', 'system-opened'],
  },
  {
    id: 'oil-mist-and-noise',
    text: 'A bleed or purge throws oil mist and is loud enough to hurt. Wear eye and ear protection, keep your face away from the outlet, don’t breathe the mist, and point the outlet away from everybody.',
    worseWhen: ['system-opened'],
  },
  {
    id: 'compressed-air-on-skin',
    text: 'Never point compressed air at skin, yours or anybody’s. It drives air and oil through the skin; such a wound looks small and needs a hospital at once. Don’t search for a leak with your hand.',
    worseWhen: ['system-opened'],
  },
  {
    id: 'belts-fan-gears',
    text: 'Belts, fan and gears pull you in, and a fan can start by itself. Tie back hair, no loose sleeves, gloves, rings or lanyard near them. Keep hands and tools out while the engine can turn; key out before you reach in.',
    worseWhen: ['engine-running'],
  },
  {
    id: 'carbon-fire',
    text: 'Carbon and oil in a hot line can catch fire, and so can what you clean it with. Let it cool before you open it, no flame, no grinding, no solvent near heat, and have an extinguisher at hand. Never burn a line clean.',
    worseWhen: ['engine-running', 'system-opened'],
  },
  {
    id: 'safety-valve',
    text: 'Never gag, plug or screw down a safety valve, not even for a test. Keep out of the way of its outlet. If one lifts, stop the engine: the valve is telling you where to look.',
    worseWhen: ['engine-running'],
  },
  {
    id: 'oil-in-brake-system',
    text: 'Oil at the service tanks or valves reaches brake valves and hoses, and brakes can drag, be slow or fail. The vehicle doesn’t go out before a qualified person has tested brake function and assessed or replaced every wetted rubber part, as the maker says.',
    worseWhen: ['brakes-released'],
  },
  {
    id: 'road-test',
    text: 'On the road you drive and nothing else. Let a second person read the gauge or a logger record it. Don’t go out with a low-air warning, a brake out of its limits or oil at the service tanks or valves.',
    worseWhen: ['brakes-released'],
  },
  {
    id: 'heavy-part',
    text: 'A compressor is heavy, oily and awkward to reach. Use a hoist or a second person, support it before the last bolt is out, and keep fingers out of the gears when it goes back in.',
    worseWhen: [],
  },
];
