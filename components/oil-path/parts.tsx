import { useId, type CSSProperties, type ReactNode } from 'react';

/**
 * The parts of the oil path, each drawn once about an origin of its own and placed by the compositions. Outlines take the
 * stroke of the drawing; grounds are paper. `level` is how far a part is filled with oil, from 0 to 1, or the style variable that says so.
 */
type Level = number | `var(${string})`;

interface PartProps {
  level: Level;
}

/** A tube in section: two walls, and what runs inside. */
export function Tube({ d, content }: { d: string; content?: ReactNode }) {
  return (
    <>
      <path d={d} strokeWidth="17" />
      <path d={d} stroke="var(--paper)" strokeWidth="11.5" />
      {content}
    </>
  );
}

export function Arrow({ x, y, turn = 0, color = 'var(--ink)' }: { x: number; y: number; turn?: number; color?: string }) {
  return <path fill={color} stroke="none" transform={`translate(${x} ${y}) rotate(${turn})`} d="M-9-7 9 0-9 7Z" />;
}

export function Drops({ at }: { at: readonly (readonly [x: number, y: number, size: number])[] }) {
  return at.map(([x, y, size]) => (
    <path key={`${x},${y}`} fill="var(--oil-fill)" stroke="var(--oil-ink)" strokeWidth="1.6" transform={`translate(${x} ${y}) scale(${size})`} d="M0-9C3-4 5-1 5 3A5 5 0 0 1-5 3C-5-1-3-4 0-9Z" />
  ));
}

/** Oil that stands in a part up to its level. `within` is the part's inside, `box` its extent. */
function Oil({ level, box: [x, y, width, height], within, pipe }: PartProps & { box: readonly [number, number, number, number] } & ({ within: string; pipe?: undefined } | { within?: undefined; pipe: string })) {
  const id = useId();
  return (
    <>
      {within !== undefined ? (
        <clipPath id={id}><path d={within} /></clipPath>
      ) : (
        <mask id={id} maskUnits="userSpaceOnUse" x={x} y={y} width={width} height={height}>
          <path d={pipe} stroke="#fff" strokeWidth="11.5" />
        </mask>
      )}
      <g {...(within !== undefined ? { clipPath: `url(#${id})` } : { mask: `url(#${id})` })}>
        <rect className="oil-level" style={{ '--level': level } as CSSProperties} x={x - 4} y={y} width={width + 8} height={height} fill="var(--oil-fill)" stroke="var(--oil-ink)" strokeWidth="3" />
      </g>
    </>
  );
}

/** Air filter housing; the origin is its upper left corner, the line leaves at (74, 36). */
export function Intake({ level }: PartProps) {
  return (
    <>
      <path d="M0 0H74V72H0Z" fill="var(--paper)" stroke="none" />
      <Oil level={level} box={[0, 0, 74, 72]} within="M0 0H74V72H0Z" />
      <rect width="74" height="72" rx="3" />
      <path d="M0 10H74M0 62H74" strokeWidth="2" />
      <path d="M8 16 14 56 20 16 26 56 32 16 38 56 44 16 50 56 56 16 62 56 68 16" strokeWidth="1.8" />
    </>
  );
}

const TAG = 'M-66 12-48-12H48L66 12V92H-66Z';

/** A tag; the origin is its eyelet. */
export function Tag({ level, children }: PartProps & { children?: ReactNode }) {
  return (
    <g transform="rotate(-5)">
      <path d={TAG} fill="var(--sheet)" stroke="none" />
      <Oil level={level} box={[-66, -12, 132, 104]} within={TAG} />
      <path d={TAG} strokeWidth="2.4" />
      <circle r="4.5" fill="var(--paper)" strokeWidth="2" />
      {children}
    </g>
  );
}

const TEETH = Array.from({ length: 18 }, (_, tooth) => tooth * 20);
const GEAR = 'M-33 0A33 33 0 0 1 33 0A33 33 0 0 1-33 0Z';

/** Drive gear about its axis. */
export function Gear({ level }: PartProps) {
  return (
    <>
      {TEETH.map((turn) => (
        <path key={turn} d="M-4-33-3-40H3L4-33" transform={`rotate(${turn})`} strokeWidth="2.2" />
      ))}
      <path d={GEAR} fill="var(--paper)" stroke="none" />
      <Oil level={level} box={[-33, -33, 66, 66]} within={GEAR} />
      <circle r="33" strokeWidth="2.4" />
      <circle r="20" strokeWidth="1.5" />
      <circle r="8" fill="var(--paper)" strokeWidth="2.4" />
    </>
  );
}

const CRANKCASE = 'M-68 194C-90 212-94 240-94 274V334H94V274C94 240 90 212 68 194Z';
const CRANKCASE_WALLS = 'M-68 194C-90 212-94 240-94 274V334H94V274C94 240 90 212 68 194';
const FINS = [66, 82, 98, 114, 130, 146, 162, 178];

/**
 * Cylinder and head over the crankcase. The origin is the middle of the head's top; the air line passes at y 24, the
 * crank turns at (0, 267), the crankcase stands from -94 to 94 and down to 334. `walls` says where it is open for pipes.
 */
export function Compressor({ cylinder, crankcase, walls = CRANKCASE_WALLS, film, children }: { cylinder: Level; crankcase: Level; walls?: string; film?: boolean; children?: ReactNode }) {
  const metal = useId();
  const hatched = `url(#${metal})`;
  return (
    <>
      <pattern id={metal} width="7" height="7" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
        <path d="M0 0V7" strokeWidth="1.6" />
      </pattern>
      <path d={CRANKCASE} fill="var(--paper)" stroke="none" />
      <Oil level={crankcase} box={[-94, 194, 188, 140]} within={CRANKCASE} />
      <path d={walls} />
      {children}
      <circle cy="267" r="30" fill="var(--paper)" />
      <circle cy="267" r="10" fill="var(--ink)" strokeWidth="2.4" />

      <path d="M-48 48H48V204H-48Z" fill="var(--paper)" stroke="none" />
      <Oil level={cylinder} box={[-48, 52, 96, 152]} within="M-48 52H48V204H-48Z" />
      {FINS.map((y) => (
        <path key={y} d={`M-84 ${y}H-68M68 ${y}H84`} strokeWidth="2.4" />
      ))}
      <path d="M-68 48H-48V204L-68 194ZM48 48H68V194L48 204Z" fill="var(--paper)" stroke="none" />
      <path d="M-68 48H-48V204L-68 194ZM48 48H68V194L48 204Z" fill={hatched} />
      {/* What the rings leave on the bore is what the air takes along. */}
      {film && <path d="M-45 206V66M45 206V66" stroke="var(--oil)" strokeWidth="5" />}
      <path d="M0 144 16 246" strokeWidth="17" />
      <path d="M0 144 16 246" stroke="var(--paper)" strokeWidth="11.5" />
      <circle cx="16" cy="246" r="10" fill="var(--paper)" strokeWidth="2.4" />
      <rect x="-42" y="98" width="84" height="64" fill={film ? 'var(--paper)' : undefined} />
      <path d="M-42 108H42M-42 117H42M-42 126H42" strokeWidth="2.6" />
      <circle cy="144" r="8" fill="var(--paper)" strokeWidth="2.4" />

      <rect x="-74" width="148" height="48" fill="var(--paper)" stroke="none" />
      <rect x="-74" width="148" height="48" fill={hatched} />
      <path d="M-74 13H-8V48H-42V35H-74ZM74 13H8V48H42V35H74Z" fill="var(--paper)" strokeWidth="2.4" />
      <path d="M-72 15H-50V33H-72ZM72 15H50V33H72Z" fill="var(--paper)" stroke="none" />
      <path d="M-46 52H-8M8 44H46" strokeWidth="4" />
      <Arrow x={-25} y={31} turn={90} />
      <Arrow x={25} y={29} turn={-90} />
    </>
  );
}

/** Governor; the origin is its upper left corner, it stands on the head with two stems. */
export function Governor({ level }: PartProps) {
  return (
    <>
      <path d="M26 58V36M38 58V36" strokeWidth="2.4" />
      <rect width="64" height="36" rx="2" fill="var(--paper)" stroke="none" />
      <Oil level={level} box={[0, 0, 64, 36]} within="M0 0H64V36H0Z" />
      <rect width="64" height="36" rx="2" />
      <path d="M8 18H14L18 8 24 28 30 8 36 28 42 8 46 18H56" strokeWidth="1.8" />
    </>
  );
}

/** Discharge line along `d`, wound within `box`. */
export function Discharge({ level, d, box }: PartProps & { d: string; box: readonly [number, number, number, number] }) {
  return <Tube d={d} content={<Oil level={level} box={box} pipe={d} />} />;
}

const DRYER = 'M-42 32Q-42 0 0 0T42 32V106H-42Z';

/** Dryer; the origin is the middle of its top, the air leaves at its foot, 118 lower. */
export function Dryer({ level, drops }: PartProps & { drops?: boolean }) {
  const beads = useId();
  return (
    <>
      <pattern id={beads} width="12" height="12" patternUnits="userSpaceOnUse">
        <circle cx="3" cy="3" r="2" strokeWidth="1.2" />
        <circle cx="9" cy="9" r="2" strokeWidth="1.2" />
      </pattern>
      <path d={DRYER} fill="var(--paper)" stroke="none" />
      <Oil level={level} box={[-42, 0, 84, 106]} within={DRYER} />
      <path d={DRYER} />
      <path d="M-34 38H34V92H-34Z" fill={`url(#${beads})`} strokeWidth="1.8" />
      <rect x="-50" y="106" width="100" height="24" fill="var(--paper)" />
      <path d="M-12 130V144H12V130" />
      {drops && <Drops at={[[0, 160, 1], [2, 178, 0.6]]} />}
    </>
  );
}

const tank = (y: number) => `M24 ${y}H160A24 25 0 0 1 160 ${y + 50}H24A24 25 0 0 1 24 ${y}Z`;

/** Two tanks; the origin is the upper left corner of the first. */
export function Tanks({ level, of = [0, 70] }: PartProps & { of?: readonly number[] }) {
  return (
    <>
      <Tube d="M74 46V74" />
      {[0, 70].map((y) => (
        <g key={y}>
          <path d={tank(y)} fill="var(--paper)" stroke="none" />
          {of.includes(y) && <Oil level={level} box={[0, y, 184, 50]} within={tank(y)} />}
          <path d={tank(y)} />
          <path d={`M24 ${y}V${y + 50}M160 ${y}V${y + 50}`} strokeWidth="1.5" />
        </g>
      ))}
    </>
  );
}

/** A glass let into the oil feed, lying or standing; the origin is its upper left corner. */
export function FeedGlass({ level, standing = false }: PartProps & { standing?: boolean }) {
  const [width, height] = standing ? [36, 84] : [96, 40];
  const inside = `M0 0H${width}V${height}H0Z`;
  return (
    <>
      <path d={inside} fill="var(--paper)" stroke="none" />
      <Oil level={level} box={[0, 0, width, height]} within={inside} />
      <rect width={width} height={height} rx="4" />
      <path d={standing ? `M-5 0H${width + 5}M-5 ${height}H${width + 5}` : `M0-5V${height + 5}M${width}-5V${height + 5}`} strokeWidth="5" />
    </>
  );
}

/** The oil line where amber means suspicion: solid, so that it is told from the hollow air line without a colour. */
export function OilLine({ d }: { d: string }) {
  return <path d={d} stroke="var(--ink)" strokeWidth="13" />;
}
