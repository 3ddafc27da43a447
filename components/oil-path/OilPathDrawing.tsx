import { useId, type ReactNode, type SVGProps } from 'react';

/**
 * The path that oil takes, as a plate in a workshop manual: the air line in ink, the oil line in amber,
 * meeting at the cylinder. Still and without figures; the words of it stand in its title and description.
 */
export function OilPathDrawing({ className }: { className?: string }) {
  const id = useId();
  const url = (name: string) => `url(#${id}${name})`;
  return (
    <svg role="img" aria-labelledby={`${id}title`} aria-describedby={`${id}desc`} viewBox="8 18 736 552" className={className} fill="none" stroke="var(--ink)" strokeWidth="3" strokeLinejoin="round">
      <title id={`${id}title`}>The path that oil takes through an air compressor</title>
      <desc id={`${id}desc`}>
        Air is drawn through the intake into the cylinder and head and pressed through the discharge line and the dryer into the tanks.
        Oil is fed from the engine to the crankcase and drains back to the engine. Where the two meet, at the cylinder, a little oil goes
        up past the piston and on with the air. The drive turns the crank, the governor tells the unloader when to rest, and a tag
        with the vehicle and its history hangs on the intake.
      </desc>
      <defs>
        <pattern id={`${id}metal`} width="7" height="7" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <path d="M0 0V7" strokeWidth="1.6" />
        </pattern>
        <pattern id={`${id}beads`} width="12" height="12" patternUnits="userSpaceOnUse">
          <circle cx="3" cy="3" r="2" strokeWidth="1.2" />
          <circle cx="9" cy="9" r="2" strokeWidth="1.2" />
        </pattern>
      </defs>

      <Intake />
      <Tag />
      <Engine />
      <Drive />
      <Crankcase />
      <Cylinder metal={url('metal')} />
      <Governor />
      <DischargeLine />
      <Dryer beads={url('beads')} />
      <Tanks />
    </svg>
  );
}

/** A tube in section: two walls, and what runs inside. */
function Tube({ d, content }: { d: string; content?: ReactNode }) {
  return (
    <>
      <path d={d} strokeWidth="17" />
      <path d={d} stroke="var(--paper)" strokeWidth="11.5" />
      {content}
    </>
  );
}

function Label({ lines, className = 'text-[22px] sm:text-[18px]', ...rest }: { lines: string[] } & SVGProps<SVGTextElement>) {
  return (
    <text className={`label ${className}`} fill="var(--ink)" stroke="var(--paper)" strokeWidth="5" paintOrder="stroke" {...rest}>
      {lines.map((line, index) => (
        <tspan key={line} x={rest.x} dy={index === 0 ? 0 : '1.1em'}>{line}</tspan>
      ))}
    </text>
  );
}

function Drops({ at }: { at: [x: number, y: number, size: number][] }) {
  return at.map(([x, y, size]) => (
    <path key={`${x},${y}`} fill="var(--oil-fill)" stroke="var(--oil-ink)" strokeWidth="1.6" transform={`translate(${x} ${y}) scale(${size})`} d="M0-9C3-4 5-1 5 3A5 5 0 0 1-5 3C-5-1-3-4 0-9Z" />
  ));
}

function Arrow({ x, y, turn = 0, color = 'var(--ink)' }: { x: number; y: number; turn?: number; color?: string }) {
  return <path fill={color} stroke="none" transform={`translate(${x} ${y}) rotate(${turn})`} d="M-9-7 9 0-9 7Z" />;
}

function Intake() {
  return (
    <g>
      <Tube d="M118 142H264" />
      <rect x="46" y="106" width="74" height="72" rx="3" fill="var(--paper)" />
      <path d="M46 116H120M46 168H120" strokeWidth="2" />
      <path d="M54 122 60 162 66 122 72 162 78 122 84 162 90 122 96 162 102 122 108 162 114 122" strokeWidth="1.8" />
      <path d="M16 124H34M16 142H34M16 160H34" strokeWidth="2" />
      <Arrow x={156} y={142} />
      <Arrow x={232} y={142} />
      <Label x={83} y={92} textAnchor="middle" lines={['Intake']} />
    </g>
  );
}

function Tag() {
  return (
    <g>
      <path d="M176 151C180 172 158 184 157 207" strokeWidth="1.8" />
      <g transform="rotate(-5 178 210) translate(-16 4) scale(0.96)">
        <path d="M112 220 130 196H226L244 220V300H112Z" fill="var(--sheet)" strokeWidth="2.4" />
        <circle cx="178" cy="208" r="4.5" fill="var(--paper)" strokeWidth="2" />
        <Label x={178} y={240} textAnchor="middle" lines={['Vehicle', 'and history']} strokeWidth="0" className="text-[18.5px] tracking-normal" />
        <path d="M126 280H230M126 290H200" strokeWidth="1.5" />
      </g>
    </g>
  );
}

function Engine() {
  return (
    <g>
      <path d="M26 481 28 486 20 528H106V481Z" fill="var(--oil-fill)" stroke="none" />
      <Tube d="M104 385H240" content={<path d="M104 385H240" stroke="var(--oil-fill)" strokeWidth="8" />} />
      <Tube d="M330 446V504H104" content={<path d="M330 446V504H104" stroke="var(--oil-fill)" strokeWidth="8" />} />
      <path d="M20 340H108V376M108 394V495M108 513V530H20" />
      <path d="M20 340 28 362 14 392 28 424 14 456 28 486 20 530" strokeWidth="2" />
      <path d="M26 481H106" strokeWidth="2" />
      <Arrow x={176} y={385} />
      <Arrow x={206} y={504} turn={180} />
      <Label x={64} y={442} textAnchor="middle" lines={['Engine']} fill="var(--ink-soft)" />
      <Label x={172} y={362} textAnchor="middle" lines={['Oil feed']} />
      <Label x={222} y={544} textAnchor="middle" lines={['Crankcase and drain']} />
    </g>
  );
}

function Drive() {
  const teeth = Array.from({ length: 18 }, (_, tooth) => tooth * 20);
  return (
    <g>
      <path d="M330 385H524" strokeWidth="1.8" strokeDasharray="16 5 3 5" />
      <g transform="translate(474 385)">
        {teeth.map((turn) => (
          <path key={turn} d="M-4-33-3-40H3L4-33" transform={`rotate(${turn})`} strokeWidth="2.2" />
        ))}
        <circle r="33" fill="var(--paper)" strokeWidth="2.4" />
        <circle r="20" strokeWidth="1.5" />
        <circle r="8" strokeWidth="2.4" />
      </g>
      <Label x={474} y={452} textAnchor="middle" lines={['Drive']} />
    </g>
  );
}

function Crankcase() {
  return (
    <g>
      <path d="M262 312C240 330 236 358 236 392V452H424V392C424 358 420 330 398 312" fill="var(--paper)" stroke="none" />
      <path d="M238 424H422V450H238Z" fill="var(--oil-fill)" stroke="none" />
      <path d="M238 424H422" strokeWidth="2" />
      <path d="M262 312C240 330 236 358 236 376M236 394V452H322M338 452H424V392C424 358 420 330 398 312" />
      <path d="M234 385H318" stroke="var(--oil-fill)" strokeWidth="8" />
      <path d="M326 446H334V460H326Z" fill="var(--oil-fill)" stroke="none" />
      <circle cx="330" cy="385" r="30" fill="var(--paper)" />
      <circle cx="330" cy="385" r="10" fill="var(--oil-fill)" strokeWidth="2.4" />
      <Drops at={[[268, 352, 0.8], [392, 350, 0.9], [404, 386, 0.7], [262, 406, 0.6]]} />
    </g>
  );
}

function Cylinder({ metal }: { metal: string }) {
  const fins = [184, 200, 216, 232, 248, 264, 280, 296];
  return (
    <g>
      <path d="M282 166H378V340H282Z" fill="var(--paper)" stroke="none" />
      {fins.map((y) => (
        <path key={y} d={`M246 ${y}H262M398 ${y}H414`} strokeWidth="2.4" />
      ))}
      <path d="M262 166H282V322L262 312ZM378 166H398V312L378 322Z" fill={metal} />
      {/* The film on the bore: what the rings leave behind is what the air takes along. */}
      <path d="M285 334V184M375 334V184" stroke="var(--oil)" strokeWidth="5" />
      <path d="M330 262 346 364" strokeWidth="17" />
      <path d="M330 262 346 364" stroke="var(--paper)" strokeWidth="11.5" />
      <circle cx="346" cy="364" r="10" fill="var(--paper)" strokeWidth="2.4" />
      <rect x="288" y="216" width="84" height="64" fill="var(--paper)" />
      <path d="M288 226H372M288 235H372M288 244H372" strokeWidth="2.6" />
      <circle cx="330" cy="262" r="8" fill="var(--paper)" strokeWidth="2.4" />
      <rect x="256" y="118" width="148" height="48" fill={metal} />
      <path d="M256 131H322V166H288V153H256ZM404 131H338V166H372V153H404Z" fill="var(--paper)" strokeWidth="2.4" />
      <path d="M258 133H280V151H258ZM402 133H380V151H402Z" fill="var(--paper)" stroke="none" />
      <path d="M284 170H322M338 162H376" strokeWidth="4" />
      <Arrow x={305} y={149} turn={90} />
      <Arrow x={355} y={147} turn={-90} />
      <Drops at={[[302, 200, 0.7], [330, 192, 0.9], [358, 202, 0.7]]} />
      <path d="M418 256H444" strokeWidth="1.8" />
      <Label x={450} y={262} lines={['Cylinder', 'and head']} />
    </g>
  );
}

function Governor() {
  return (
    <g>
      <path d="M362 78H724V438H712" strokeWidth="2" strokeDasharray="8 6" />
      <path d="M324 118V96M336 118V96" strokeWidth="2.4" />
      <rect x="298" y="60" width="64" height="36" rx="2" fill="var(--paper)" />
      <path d="M306 78H312L316 68 322 88 328 68 334 88 340 68 344 78H354" strokeWidth="1.8" />
      <Label x={330} y={46} textAnchor="middle" lines={['Unloader and governor']} />
    </g>
  );
}

function DischargeLine() {
  const d = 'M398 142H446C466 142 462 112 484 112S506 172 528 172S548 142 566 142H594Q620 142 620 168V210';
  return (
    <g>
      <Tube d={d} content={<path d={d} stroke="var(--oil)" strokeWidth="5" strokeDasharray="1 15" strokeLinecap="round" />} />
      <Arrow x={428} y={142} />
      <Arrow x={592} y={142} />
      <Label x={506} y={204} textAnchor="middle" lines={['Discharge line']} />
    </g>
  );
}

function Dryer({ beads }: { beads: string }) {
  return (
    <g>
      <Tube d="M578 326H552V416" />
      <Arrow x={552} y={378} turn={90} />
      <path d="M578 240Q578 208 620 208T662 240V314H578Z" fill="var(--paper)" />
      <path d="M586 246H654V300H586Z" fill={beads} strokeWidth="1.8" />
      <rect x="570" y="314" width="100" height="24" fill="var(--paper)" />
      <path d="M608 338V352H632V338" />
      <Drops at={[[620, 368, 1], [622, 386, 0.6]]} />
      <Label x={652} y={382} lines={['Dryer']} />
    </g>
  );
}

function Tanks() {
  return (
    <g>
      <Tube d="M600 458V486" />
      {[412, 482].map((y) => (
        <g key={y}>
          <rect x="526" y={y} width="184" height="50" rx="24" fill="var(--paper)" />
          <path d={`M550 ${y}V${y + 50}M686 ${y}V${y + 50}`} strokeWidth="1.5" />
        </g>
      ))}
      <path d="M552 452H684V460H552Z" fill="var(--oil-fill)" stroke="none" />
      <path d="M551 452H685" stroke="var(--oil-ink)" strokeWidth="2" />
      <Label x={618} y={560} textAnchor="middle" lines={['Tanks and system']} />
    </g>
  );
}
