import { useId, type SVGProps } from 'react';
import { Arrow, Compressor, Drops, Dryer, Gear, Governor, Intake, Tag, Tanks, Tube } from './parts';

/**
 * The path that oil takes, as a plate in a workshop manual: the air line in ink, the oil line in amber,
 * meeting at the cylinder. Still and without figures; the words of it stand in its title and description.
 */
export function OilPathDrawing({ className }: { className?: string }) {
  const id = useId();
  return (
    <svg role="img" aria-labelledby={`${id}title`} aria-describedby={`${id}desc`} viewBox="8 18 736 552" className={className} fill="none" stroke="var(--ink)" strokeWidth="3" strokeLinejoin="round">
      <title id={`${id}title`}>The path that oil takes through an air compressor</title>
      <desc id={`${id}desc`}>
        Air is drawn through the intake into the cylinder and head and pressed through the discharge line and the dryer into the tanks.
        Oil is fed from the engine to the crankcase and drains back to the engine. Where the two meet, at the cylinder, a little oil goes
        up past the piston and on with the air. The drive turns the crank, the governor tells the unloader when to rest, and a tag
        with the vehicle and its history hangs on the intake.
      </desc>
      <AirIn />
      <OilLine />
      <Middle />
      <AirOut />
    </svg>
  );
}

function Label({ lines, className = 'text-[18px] max-sm:hidden', ...rest }: { lines: string[] } & SVGProps<SVGTextElement>) {
  return (
    <text className={`label ${className}`} fill="var(--ink)" stroke="var(--paper)" strokeWidth="5" paintOrder="stroke" {...rest}>
      {lines.map((line, index) => (
        <tspan key={line} x={rest.x} dy={index === 0 ? 0 : '1.1em'}>{line}</tspan>
      ))}
    </text>
  );
}

function AirIn() {
  return (
    <>
      <Tube d="M118 142H264" />
      <g transform="translate(46 106)"><Intake level={0} /></g>
      <path d="M16 124H34M16 142H34M16 160H34" strokeWidth="2" />
      <Arrow x={156} y={142} />
      <Arrow x={232} y={142} />
      <Label x={83} y={92} textAnchor="middle" lines={['Intake']} />
      <path d="M176 151C180 172 158 184 157 204" strokeWidth="1.8" />
      <g transform="translate(156 204) scale(0.96)">
        <Tag level={0}>
          <Label x={0} y={32} textAnchor="middle" lines={['Vehicle', 'and history']} strokeWidth="0" className="text-[18.5px] tracking-normal max-sm:hidden" />
          <path d="M-52 72H52M-52 82H22" strokeWidth="1.5" />
        </Tag>
      </g>
    </>
  );
}

function OilLine() {
  const oil = (d: string) => <Tube d={d} content={<path d={d} stroke="var(--oil-fill)" strokeWidth="8" />} />;
  return (
    <>
      <path d="M26 481 28 486 20 528H106V481Z" fill="var(--oil-fill)" stroke="none" />
      {oil('M104 385H240')}
      {oil('M330 446V504H104')}
      <path d="M20 340H108V376M108 394V495M108 513V530H20" />
      <path d="M20 340 28 362 14 392 28 424 14 456 28 486 20 530" strokeWidth="2" />
      <path d="M26 481H106" strokeWidth="2" />
      <Arrow x={176} y={385} />
      <Arrow x={206} y={504} turn={180} />
      <Label x={64} y={442} textAnchor="middle" lines={['Engine']} fill="var(--ink-soft)" />
      <Label x={172} y={362} textAnchor="middle" lines={['Oil feed']} />
      <Label x={222} y={544} textAnchor="middle" lines={['Crankcase and drain']} />
    </>
  );
}

/** The crankcase's walls, open for the feed at the left and the drain below. */
const WALLS = 'M-68 194C-90 212-94 240-94 258M-94 276V334H-8M8 334H94V274C94 240 90 212 68 194';

function Middle() {
  return (
    <>
      <path d="M330 385H524" strokeWidth="1.8" strokeDasharray="16 5 3 5" />
      <g transform="translate(474 385)"><Gear level={0} /></g>
      <Label x={474} y={452} textAnchor="middle" lines={['Drive']} />
      <g transform="translate(330 118)">
        <Compressor cylinder={0} crankcase={0.2} walls={WALLS} film>
          <path d="M-96 267H-12" stroke="var(--oil-fill)" strokeWidth="8" />
          <path d="M-4 328H4V342H-4Z" fill="var(--oil-fill)" stroke="none" />
        </Compressor>
      </g>
      <Drops at={[[268, 352, 0.8], [392, 350, 0.9], [404, 386, 0.7], [262, 406, 0.6], [302, 200, 0.7], [330, 192, 0.9], [358, 202, 0.7]]} />
      <path d="M418 256H444" strokeWidth="1.8" />
      <Label x={450} y={262} lines={['Cylinder', 'and head']} />
      <path d="M362 78H724V438H712" strokeWidth="2" strokeDasharray="8 6" />
      <g transform="translate(298 60)"><Governor level={0} /></g>
      <Label x={330} y={46} textAnchor="middle" lines={['Unloader and governor']} />
    </>
  );
}

function AirOut() {
  const line = 'M398 142H446C466 142 462 112 484 112S506 172 528 172S548 142 566 142H594Q620 142 620 168V210';
  return (
    <>
      <Tube d={line} content={<path d={line} stroke="var(--oil)" strokeWidth="5" strokeDasharray="1 15" strokeLinecap="round" />} />
      <Arrow x={428} y={142} />
      <Arrow x={592} y={142} />
      <Label x={506} y={204} textAnchor="middle" lines={['Discharge line']} />
      <Tube d="M578 326H552V416" />
      <Arrow x={552} y={378} turn={90} />
      <g transform="translate(620 208)"><Dryer level={0} drops /></g>
      <Label x={652} y={382} lines={['Dryer']} />
      <g transform="translate(526 412)"><Tanks level={0.18} of={[0]} /></g>
      <Label x={618} y={560} textAnchor="middle" lines={['Tanks and system']} />
    </>
  );
}
