import type { StationId } from '@/lib/diagnose/stations';
import { Arrow, Compressor, Discharge, Dryer, FeedGlass, Gear, Governor, Intake, OilLine, Tag, Tanks, Tube } from './parts';
import { levelOf, TALL, WIDE } from './places';

/** How full a station is stands in the style of whatever holds the drawing: an answer changes that and no line of it. */
const at = (station: StationId) => `var(${levelOf(station)})` as const;

const drawing = { 'aria-hidden': true, fill: 'none', stroke: 'var(--ink)', strokeWidth: 3, strokeLinejoin: 'round' } as const;
const COIL = 'M700 134C718 134 714 100 734 100S750 168 770 168S786 100 806 100S822 168 842 168S860 134 876 134';

/** The drawing of the oil path for `OilPath`, drawn once by the server: none of its lines is sent as script. */
export function OilPathCompositions() {
  return (
    <>
      <WideComposition />
      <TallComposition />
    </>
  );
}

/** The path across a page: air from left to right, the engine at the left, the tanks at the right. */
function WideComposition() {
  return (
    <svg {...drawing} viewBox={`0 0 ${WIDE.width} ${WIDE.height}`} className="oil-path-wide">
      <Tube d="M112 134H430" />
      <Arrow x={152} y={134} />
      <Arrow x={384} y={134} />
      <g transform="translate(38 98)"><Intake level={at('intake')} /></g>
      <path d="M8 116H26M8 134H26M8 152H26" strokeWidth="2" />
      <path d="M206 143C210 168 202 186 200 206" strokeWidth="1.8" />
      <g transform="translate(200 206) scale(0.86)">
        <Tag level={at('vehicle-and-history')}><path d="M-44 34H44M-44 50H44M-44 66H14" strokeWidth="1.8" /></Tag>
      </g>

      <OilLine d="M88 378H410M404 428H88" />
      <Engine />
      <Arrow x={112} y={378} color="var(--paper)" />
      <Arrow x={376} y={378} color="var(--paper)" />
      <Arrow x={240} y={428} turn={180} color="var(--paper)" />
      <g transform="translate(150 358)"><FeedGlass level={at('oil-feed')} /></g>

      <path d="M500 377H706" strokeWidth="1.8" strokeDasharray="16 5 3 5" />
      <g transform="translate(662 377)"><Gear level={at('drive')} /></g>
      <g transform="translate(500 110)"><Compressor cylinder={at('cylinder-and-head')} crankcase={at('crankcase-and-drain')} /></g>
      <path d="M570 242H592" strokeWidth="1.8" />

      <path d="M500 52V8H1234V308H1224" strokeWidth="2" strokeDasharray="8 6" />
      <g transform="translate(468 52)"><Governor level={at('unloader-and-governor')} /></g>

      <Tube d="M574 134H704" />
      <Tube d="M872 134H904Q930 134 930 160V194" />
      <Discharge level={at('discharge-line')} d={COIL} box={[696, 92, 184, 84]} />
      <Arrow x={640} y={134} />
      <Tube d="M976 308H1044" />
      <Arrow x={1010} y={308} />
      <g transform="translate(930 190)"><Dryer level={at('dryer')} /></g>
      <g transform="translate(1040 283)"><Tanks level={at('tanks-and-system')} /></g>
    </svg>
  );
}

function Engine() {
  return (
    <>
      <path d="M6 334H92V474H6L14 452 0 424 14 392 0 362Z" fill="var(--paper)" strokeWidth="2.4" />
      <text className="label text-[20px]" x="52" y="412" textAnchor="middle" fill="var(--ink-soft)" stroke="none">Engine</text>
    </>
  );
}

/** The path down a phone: the compressor in the middle, the air over it, the engine under it. Half the size of the other. */
function TallComposition() {
  const COIL_DOWN = 'M388 156C406 156 402 122 422 122S438 190 458 190S476 156 492 156';
  return (
    <svg {...drawing} viewBox={`0 0 ${TALL.width} ${TALL.height}`} className="oil-path-tall">
      <g transform="scale(0.5)">
        <Tube d="M110 156H218" />
        <Arrow x={170} y={156} />
        <g transform="translate(36 120)"><Intake level={at('intake')} /></g>
        <path d="M4 138H24M4 156H24M4 174H24" strokeWidth="2" />

        <OilLine d="M182 624V462Q182 448 192 448H200" />
        <OilLine d="M230 466V624" />
        <Arrow x={182} y={488} turn={-90} color="var(--paper)" />
        <Arrow x={230} y={580} turn={90} color="var(--paper)" />
        <path d="M112 616H344V676L316 664 284 682 252 664 220 682 188 664 156 682 112 668Z" fill="var(--paper)" strokeWidth="2.4" />
        <text className="label text-[25px]" x="228" y="656" textAnchor="middle" fill="var(--ink-soft)" stroke="none">Engine</text>
        <g transform="translate(164 518)"><FeedGlass level={at('oil-feed')} standing /></g>

        <path d="M64 399H288" strokeWidth="1.8" strokeDasharray="16 5 3 5" />
        <g transform="translate(96 399)"><Gear level={at('drive')} /></g>
        <g transform="translate(288 132)"><Compressor cylinder={at('cylinder-and-head')} crankcase={at('crankcase-and-drain')} /></g>
        <path d="M190 264H202" strokeWidth="2" />
        <g transform="translate(256 86) scale(1 0.8)"><Governor level={at('unloader-and-governor')} /></g>

        <Tube d="M362 156H392" />
        <Tube d="M488 156H500Q524 156 524 180V216" />
        <Discharge level={at('discharge-line')} d={COIL_DOWN} box={[380, 112, 120, 88]} />
        <Tube d="M476 330H438Q418 330 418 350V460" />
        <Arrow x={418} y={404} turn={90} />
        <g transform="translate(524 212)"><Dryer level={at('dryer')} /></g>
        <g transform="translate(394 452) scale(0.96)"><Tanks level={at('tanks-and-system')} /></g>

        <path d="M344 636C362 636 362 664 358 690" strokeWidth="1.8" />
        <g transform="translate(358 690) scale(0.74)">
          <Tag level={at('vehicle-and-history')}><path d="M-44 34H44M-44 52H44M-44 70H14" strokeWidth="2" /></Tag>
        </g>
      </g>
    </svg>
  );
}
