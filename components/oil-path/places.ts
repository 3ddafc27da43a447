import type { CSSProperties } from 'react';
import type { StationId } from '@/lib/diagnose/stations';

/** x, y, width, height in the units of the composition. */
type Box = readonly [number, number, number, number];

interface Placed {
  /** What is touched: the part with its label. */
  box: Box;
  /** Where its words stand, within the box. */
  label: Box;
  align: 'left' | 'center' | 'right';
  /** Which end of its box the label leans to. */
  lean: 'start' | 'center' | 'end';
}

interface Composition {
  width: number;
  height: number;
  places: Readonly<Record<StationId, Placed>>;
}

/** Where the stations stand in the drawing across a page. */
export const WIDE: Composition = {
  width: 1240,
  height: 506,
  places: {
    intake: { box: [0, 26, 152, 152], label: [0, 30, 152, 60], align: 'center', lean: 'end' },
    'cylinder-and-head': { box: [412, 106, 326, 226], label: [594, 196, 144, 92], align: 'left', lean: 'center' },
    'discharge-line': { box: [696, 26, 196, 152], label: [696, 30, 196, 60], align: 'center', lean: 'end' },
    dryer: { box: [862, 186, 136, 254], label: [862, 362, 136, 66], align: 'center', lean: 'start' },
    'tanks-and-system': { box: [1030, 272, 210, 206], label: [1030, 412, 204, 62], align: 'center', lean: 'start' },
    'oil-feed': { box: [124, 294, 220, 108], label: [130, 298, 200, 54], align: 'left', lean: 'end' },
    'crankcase-and-drain': { box: [386, 336, 232, 170], label: [386, 450, 232, 56], align: 'center', lean: 'start' },
    drive: { box: [614, 330, 214, 94], label: [710, 346, 118, 62], align: 'left', lean: 'center' },
    'unloader-and-governor': { box: [462, 16, 252, 80], label: [542, 16, 172, 80], align: 'left', lean: 'center' },
    'vehicle-and-history': { box: [136, 184, 268, 108], label: [266, 194, 138, 90], align: 'left', lean: 'center' },
  },
};

/** Where they stand in the drawing down a phone. */
export const TALL: Composition = {
  width: 288,
  height: 388,
  places: {
    intake: { box: [0, 18, 96, 82], label: [0, 20, 96, 36], align: 'left', lean: 'end' },
    'cylinder-and-head': { box: [0, 102, 188, 74], label: [0, 108, 94, 48], align: 'right', lean: 'center' },
    'discharge-line': { box: [190, 18, 98, 82], label: [190, 20, 98, 36], align: 'center', lean: 'end' },
    dryer: { box: [204, 102, 84, 114], label: [216, 181, 72, 34], align: 'center', lean: 'start' },
    'tanks-and-system': { box: [192, 218, 96, 112], label: [192, 285, 96, 44], align: 'center', lean: 'start' },
    'oil-feed': { box: [0, 258, 102, 50], label: [0, 262, 78, 42], align: 'left', lean: 'center' },
    'crankcase-and-drain': { box: [98, 178, 93, 106], label: [122, 236, 69, 46], align: 'left', lean: 'start' },
    drive: { box: [4, 176, 80, 82], label: [4, 222, 78, 34], align: 'center', lean: 'start' },
    'unloader-and-governor': { box: [97, -6, 92, 70], label: [97, -6, 92, 46], align: 'center', lean: 'end' },
    'vehicle-and-history': { box: [150, 334, 138, 54], label: [211, 338, 77, 46], align: 'left', lean: 'center' },
  },
};

/** The style variable that holds how full a station is drawn. */
export const levelOf = (station: StationId) => `--at-${station}` as const;

const percent = (share: number) => `${Number((share * 100).toFixed(3))}%`;

/** `inner` as a CSS inset of `outer`. */
function inset([x, y, width, height]: Box, [outerX, outerY, outerWidth, outerHeight]: Box): string {
  return [
    percent((y - outerY) / outerHeight),
    percent((outerX + outerWidth - x - width) / outerWidth),
    percent((outerY + outerHeight - y - height) / outerHeight),
    percent((x - outerX) / outerWidth),
  ].join(' ');
}

const whole = ({ width, height }: Composition): Box => [0, 0, width, height];

/** Both places of a station's button; the style sheet takes one by the width that there is. */
export const buttonPlace = (station: StationId) =>
  ({ '--wide': inset(WIDE.places[station].box, whole(WIDE)), '--tall': inset(TALL.places[station].box, whole(TALL)) }) as CSSProperties;

/** Both places of a station's words within its button. */
export function labelPlace(station: StationId): CSSProperties {
  const wide = WIDE.places[station];
  const tall = TALL.places[station];
  return {
    '--wide': inset(wide.label, wide.box),
    '--tall': inset(tall.label, tall.box),
    '--wide-align': wide.align,
    '--tall-align': tall.align,
    '--wide-lean': wide.lean,
    '--tall-lean': tall.lean,
  } as CSSProperties;
}
