import { Group } from '@visx/group';
import { Line } from '@visx/shape';
import { figureText, sameFigure } from './figures';
import { Picture } from './picture';

/** A Bloch vector; its length is 1 for a pure state and at most 1 for a density operator. */
export interface BlochVector {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

export interface BlochSphereProps {
  readonly reference: BlochVector;
  readonly answer?: BlochVector;
}

const radius = 96;
const centre = { x: 150, y: 128 };
/** Seen from a little above and from the side of +x and +y: angle about z, and height of the eye, in radians. */
const turn = (-28 * Math.PI) / 180;
const tilt = (17 * Math.PI) / 180;

interface Point {
  readonly x: number;
  readonly y: number;
  /** Towards the eye. */
  readonly depth: number;
}

/** A state on (or a density operator within) the Bloch sphere, seen in parallel projection. */
export function BlochSphere({ reference, answer }: BlochSphereProps) {
  const same = answer && (['x', 'y', 'z'] as const).every((axis) => sameFigure(reference[axis], answer[axis]));
  return (
    <Picture
      title="Bloch sphere"
      description={`Reference at ${vectorText(reference)}${answer ? `; answer at ${vectorText(answer)}. They ${same ? 'agree' : 'differ'}.` : '.'}`}
      size={[300, 262]}
      answer={answer ? (same ? 'agrees' : 'differs') : undefined}
      table={{
        head: answer ? ['component', 'reference', 'answer'] : ['component', 'reference'],
        rows: (['x', 'y', 'z'] as const).map((axis) => [
          axis,
          figureText(reference[axis]),
          ...(answer ? [figureText(answer[axis])] : []),
        ]),
      }}
    >
      <circle cx={centre.x} cy={centre.y} r={radius} className="fill-field stroke-edge" strokeWidth={1} />
      <GreatCircle at={(angle) => ({ x: Math.cos(angle), y: Math.sin(angle), z: 0 })} />
      <GreatCircle at={(angle) => ({ x: 0, y: Math.cos(angle), z: Math.sin(angle) })} />
      <GreatCircle at={(angle) => ({ x: Math.cos(angle), y: 0, z: Math.sin(angle) })} />
      <Axis to={{ x: 1, y: 0, z: 0 }} name="x" />
      <Axis to={{ x: 0, y: 1, z: 0 }} name="y" />
      <Axis to={{ x: 0, y: 0, z: 1 }} name="z" />
      <Arrow vector={reference} tone="reference" />
      {answer ? <Arrow vector={answer} tone={same ? 'agrees' : 'differs'} /> : null}
    </Picture>
  );
}

function project({ x, y, z }: BlochVector): Point {
  const across = x * Math.sin(turn) + y * Math.cos(turn);
  const away = x * Math.cos(turn) - y * Math.sin(turn);
  return {
    x: centre.x + radius * across,
    y: centre.y - radius * (z * Math.cos(tilt) - away * Math.sin(tilt)),
    depth: away * Math.cos(tilt) + z * Math.sin(tilt),
  };
}

/** A great circle, its far half broken. */
function GreatCircle({ at }: { at: (angle: number) => BlochVector }) {
  const points = Array.from({ length: 97 }, (_, step) => project(at((step * Math.PI) / 48)));
  const half = (near: boolean) =>
    points
      .map((point, index) => {
        const kept = point.depth >= 0 === near;
        const before = points[index - 1];
        const joined = before !== undefined && before.depth >= 0 === near;
        return kept ? `${joined ? 'L' : 'M'}${point.x.toFixed(1)} ${point.y.toFixed(1)}` : '';
      })
      .join('');
  return (
    <g fill="none" className="stroke-hairline" strokeWidth={1.2}>
      <path d={half(true)} />
      <path d={half(false)} strokeDasharray="2 4" />
    </g>
  );
}

function Axis({ to, name }: { to: BlochVector; name: string }) {
  const tip = project(to);
  const length = Math.hypot(tip.x - centre.x, tip.y - centre.y);
  const out = (length + 14) / length;
  const label = { x: centre.x + (tip.x - centre.x) * out, y: centre.y + (tip.y - centre.y) * out };
  return (
    <Group>
      <Line from={centre} to={tip} className="stroke-edge" strokeWidth={1} />
      <text x={label.x} y={label.y + 4} textAnchor="middle" className="fill-grey italic">
        {name}
      </text>
    </Group>
  );
}

const tones = {
  reference: 'stroke-grey fill-grey',
  agrees: 'stroke-verdigris fill-verdigris',
  differs: 'stroke-madder fill-madder',
};

/** A vector with its shadow on the equator; reference as a ring, answer as a disc, so that shape tells them apart too. */
function Arrow({ vector, tone }: { vector: BlochVector; tone: keyof typeof tones }) {
  const tip = project(vector);
  const foot = project({ ...vector, z: 0 });
  const ring = tone === 'reference';
  return (
    <g className={tones[tone]}>
      <path
        d={`M${centre.x} ${centre.y}L${foot.x} ${foot.y}L${tip.x} ${tip.y}`}
        fill="none"
        strokeWidth={1}
        strokeDasharray="2 3"
      />
      <Line from={centre} to={tip} strokeWidth={ring ? 3 : 2} />
      <circle cx={tip.x} cy={tip.y} r={ring ? 6.5 : 4} strokeWidth={2} className={ring ? 'fill-field' : ''} />
    </g>
  );
}

function vectorText({ x, y, z }: BlochVector): string {
  return `(${[x, y, z].map(figureText).join(', ')})`;
}
