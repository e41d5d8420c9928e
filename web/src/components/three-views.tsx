/**
 * Plan, side and rear view of an aircraft, each turned by one angle: what heading, elevation and bank are, at a glance.
 * A drawing of the words, not of an attitude: the three turns do not act together in it.
 */
export function ThreeViews({ heading, elevation, bank, className = '' }: { heading: number; elevation: number; bank: number; className?: string }) {
  return (
    <svg viewBox="0 0 560 430" aria-hidden="true" fill="none" stroke="currentColor" strokeWidth="1.3" strokeLinejoin="round" className={className}>
      <g transform="translate(150 215)">
        <path d="M0-185V150M-120 0H120" {...CENTRE_LINE} />
        <g transform={`rotate(${heading})`}><path d="M0-170V110" {...CENTRE_LINE} /><Outline paths={PLAN} /></g>
        <Arc radius={150} from={-90} to={heading - 90} />
        <Label x={0} y={-192} anchor="middle">N</Label><Label x={44} y={-158}>{`ψ ${degrees(heading, 3)}`}</Label>
      </g>
      <g transform="translate(400 105)">
        <path d="M-95 0H115" {...CENTRE_LINE} />
        <g transform={`rotate(${-elevation})`}><path d="M-60 0H105" {...CENTRE_LINE} /><Outline paths={SIDE} /></g>
        <Arc radius={92} from={0} to={-elevation} />
        <Label x={98} y={-16}>{`θ ${degrees(elevation, 1)}`}</Label>
      </g>
      <g transform="translate(400 315)">
        <path d="M-95 0H115M0-60V60" {...CENTRE_LINE} />
        <g transform={`rotate(${bank})`}><path d="M-90 0H105" {...CENTRE_LINE} /><Outline paths={REAR} /></g>
        <Arc radius={92} from={0} to={bank} />
        <Label x={98} y={42}>{`φ ${degrees(bank, 1)}`}</Label>
      </g>
    </svg>
  );
}

const CENTRE_LINE = { strokeWidth: 0.7, strokeDasharray: '14 3 3 3', className: 'text-soft' } as const;
/** Outlines back to front, so that what is nearer covers what is behind it. */
const PLAN = ['M-4 82L-38 90V100L0 103 38 100V90L4 82Z', 'M-12-24L-112-16V6L-12 13H12L112 6V-16L12-24Z', 'M0-84C8-80 12-68 13-52V4C12 34 7 66 3 104H-3C-7 66-12 34-13 4V-52C-12-68-8-80 0-84Z', 'M-17-86H17M-13-44H13'];
const SIDE = ['M-54-13L-72-44H-88L-79-5Z', 'M84 2C78-7 64-10 50-12L36-26C20-31 2-30-10-26-30-20-56-13-79-8L-81-2C-48 8-18 14 14 15H60C74 13 82 9 84 2Z', 'M-10-27C6-33 34-33 44-27Z', 'M-62-8L-92-7', 'M86-15V19M36-26L40-12H50'];
const REAR = ['M14 10L56-20M-14 10L-56-20', 'M-108-25L0-21 108-25V-21L0-17-108-21Z', 'M0-20C13-20 16-8 16 2S10 22 0 22-16 12-16 2-13-20 0-20Z', 'M-42-9H42V-6H-42Z', 'M-2-9L0-56 2-9Z'];

function Outline({ paths }: { paths: readonly string[] }) {
  return paths.map((path) => <path key={path} d={path} className="fill-sheet" />);
}

const degrees = (value: number, digits: number): string => (digits === 3 ? `${value.toFixed(0).padStart(3, '0')}°` : `${value.toFixed(0)}°`);

/** A dimension line round the origin with an arrowhead at its end; angles in degrees from the right, clockwise. */
function Arc({ radius, from, to }: { radius: number; from: number; to: number }) {
  const at = (angle: number, r = radius) => `${(r * Math.cos((angle * Math.PI) / 180)).toFixed(2)} ${(r * Math.sin((angle * Math.PI) / 180)).toFixed(2)}`;
  const sense = Math.sign(to - from) || 1;
  const head = Math.min(Math.abs(to - from), (7 / radius) * (180 / Math.PI)) * sense;
  return (
    <g className="text-accent">
      <path d={`M${at(from)}A${radius} ${radius} 0 0 ${sense > 0 ? 1 : 0} ${at(to)}`} />
      <path d={`M${at(to)}L${at(to - head, radius - 3)}L${at(to - head, radius + 3)}Z`} fill="currentColor" stroke="none" />
    </g>
  );
}

function Label({ x, y, anchor = 'start', children }: { x: number; y: number; anchor?: 'start' | 'middle'; children: string }) {
  return <text x={x} y={y} textAnchor={anchor} fill="currentColor" stroke="none" className="figures text-[15px]">{children}</text>;
}
