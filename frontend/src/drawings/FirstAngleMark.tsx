import { INK } from './ink';

/** The first-angle symbol of ISO 5456-2: a truncated cone from the side, and its end view to the right. */
export function FirstAngleMark({ x, y }: { x: number; y: number }) {
  return (
    <g transform={`translate(${x} ${y})`} fill="none" stroke={INK.text} strokeWidth={0.9}>
      <path d="M0 3.5L16 0V14L0 10.5Z" />
      <circle cx={28} cy={7} r={7} />
      <circle cx={28} cy={7} r={3.5} />
      <path d="M-3 7H19M19 7H38M28 -2.5V16.5" strokeWidth={0.5} strokeDasharray="4 1.2 0.8 1.2" />
    </g>
  );
}
