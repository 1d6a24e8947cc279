import { type StripShape } from '@stageyard/libs/train-planner';

/** Colours of the drawing, on white. */
const LINE = { outline: '#20282B', pinion: '#D5E3DF', wheel: '#E9EEEB', centre: '#4A6572', brass: '#86590B' };

/** Blank left around the drawing, in parts of its larger side. */
const MARGIN = 0.04;

/**
 * The train seen along its shafts as a picture in a box, to scale: tip circles thin solid, pitch circles and centre
 * lines dash-dot, an arrow for the input's sense of rotation.
 * @param width px of the box @param height px of the box
 */
export function stripSvg(shape: StripShape, width: number, height: number): string {
  const frame = frameOf(shape);
  const scale = Math.min(width / frame.width, height / frame.height);
  // One pixel of the finished picture, in mm: line widths stay the same whatever the train's size.
  const px = 1 / scale;
  const left = frame.x + frame.width / 2 - width / scale / 2;
  const top = -(frame.y + frame.height / 2) - height / scale / 2;
  const viewBox = [left, top, width / scale, height / scale].map(plain).join(' ');
  // Wheels lie behind the pinions that share their shaft.
  const order = [...shape.gears].sort((a, b) => b.tipRadius - a.tipRadius);
  const gears = order.map((gear) => {
    const fill = gear.role === 'pinion' ? LINE.pinion : LINE.wheel;
    const at = `cx="${plain(gear.x)}" cy="${plain(-gear.y)}"`;
    return (
      `<circle ${at} r="${plain(gear.tipRadius)}" fill="${fill}" fill-opacity="0.85" stroke="${LINE.outline}" stroke-width="${plain(px)}"/>` +
      `<circle ${at} r="${plain(gear.pitchRadius)}" fill="none" stroke="${LINE.centre}" stroke-width="${plain(0.7 * px)}" stroke-dasharray="${dashDot(px)}"/>`
    );
  });
  const body = [
    ...gears,
    ...shape.axes.map((axis) => cross(axis, px)),
    centreLine(shape, px),
    arrow(shape, px),
  ];
  return `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}" viewBox="${viewBox}">${body.join('')}</svg>`;
}

/** The shape's bounds with the arrow and a margin, mm, y upwards. */
function frameOf({ bounds, inputArrow: arrow }: StripShape) {
  const x1 = Math.min(bounds.x, arrow.x - arrow.radius);
  const x2 = Math.max(bounds.x + bounds.width, arrow.x + arrow.radius);
  const y1 = Math.min(bounds.y, arrow.y - arrow.radius);
  const y2 = Math.max(bounds.y + bounds.height, arrow.y + arrow.radius);
  const margin = MARGIN * Math.max(x2 - x1, y2 - y1);
  return { x: x1 - margin, y: y1 - margin, width: x2 - x1 + 2 * margin, height: y2 - y1 + 2 * margin };
}

function cross({ x, y }: { x: number; y: number }, px: number): string {
  const arm = 4 * px;
  const path = `M${plain(x - arm)} ${plain(-y)}h${plain(2 * arm)}M${plain(x)} ${plain(-y - arm)}v${plain(2 * arm)}`;
  return `<path d="${path}" stroke="${LINE.outline}" stroke-width="${plain(px)}" fill="none"/>`;
}

/** The line through the axes, a little past the gears at both ends. */
function centreLine({ bounds, axes }: StripShape, px: number): string {
  const y = plain(-(axes[0]?.y ?? 0));
  const path = `M${plain(bounds.x - 3 * px)} ${y}H${plain(bounds.x + bounds.width + 3 * px)}`;
  return `<path d="${path}" stroke="${LINE.centre}" stroke-width="${plain(0.7 * px)}" stroke-dasharray="${dashDot(px)}"/>`;
}

/** A third of a turn around the input shaft, with a head at its end. */
function arrow({ inputArrow: { x, y, radius, clockwise } }: StripShape, px: number): string {
  const turn = clockwise ? -1 : 1;
  const point = (angle: number, r = radius) => ({
    x: x + r * Math.cos(angle),
    y: -(y + r * Math.sin(angle)),
  });
  const from = Math.PI / 2 - (turn * Math.PI) / 3;
  const to = from + (turn * 2 * Math.PI) / 3;
  const start = point(from);
  const end = point(to);
  const arc = `M${plain(start.x)} ${plain(start.y)}A${plain(radius)} ${plain(radius)} 0 0 ${clockwise ? 1 : 0} ${plain(end.x)} ${plain(end.y)}`;
  const head = 6 * px;
  const back = to - (turn * head) / radius;
  const wings = [point(back, radius + head / 2), point(back, radius - head / 2)];
  const tip = point(to + (turn * head) / 3 / radius);
  const triangle = [tip, ...wings].map((corner) => `${plain(corner.x)},${plain(corner.y)}`).join(' ');
  return (
    `<path d="${arc}" fill="none" stroke="${LINE.brass}" stroke-width="${plain(1.6 * px)}"/>` +
    `<polygon points="${triangle}" fill="${LINE.brass}"/>`
  );
}

function dashDot(px: number): string {
  return [7, 2, 1.5, 2].map((length) => plain(length * px)).join(' ');
}

function plain(value: number): string {
  return String(Number(value.toFixed(4)));
}
