/** Causes that the default rulebook doesn't list, in the words of whoever found them. Inventions from what could be. */
export const UNLISTED: Record<string, string> = {
  'wrong-gasket': 'Mounting gasket of another model: it covers half of the oil return, and the compressor was built for the other engine.',
  'pump-seal': 'Shaft seal of the steering pump behind the compressor leaks its fluid into the crankcase.',
  lubricator: 'An oiler for air tools was teed into the accessory line and feeds the tanks.',
  'trailer-oil': 'The oil came in from a trailer through the supply line; tractor alone stays dry.',
  'wrong-oil': 'Sump was filled with a much thinner oil than the maker asks for.',
  'alcohol-unit': 'The old alcohol injector had been topped up with hydraulic oil.',
  'loose-mounting': 'Mounting bolts had worked loose, so that the flange breathes and the drain stands above the joint.',
};

export const UNLISTED_KEYS = Object.keys(UNLISTED);
