import { Resvg } from '@resvg/resvg-js';
import { trainStrip, type TrainSpec } from '@stageyard/libs/train-planner';
import { stripSvg } from './strip-svg.js';

/** A picture and the size it is shown at, px of 1/96 inch. */
export interface Picture {
  png: Buffer;
  width: number;
  height: number;
}

/** Pixels of the picture a pixel shown: sharp when printed. */
const SHARPNESS = 3;

/** The train strip to scale in a box. @param width px shown @param height px shown */
export function stripPicture(spec: TrainSpec, width: number, height: number): Picture {
  const svg = stripSvg(trainStrip(spec), width, height);
  const drawing = new Resvg(svg, {
    fitTo: { mode: 'zoom', value: SHARPNESS },
    font: { loadSystemFonts: false },
    background: '#FFFFFF',
  });
  return { png: drawing.render().asPng(), width, height };
}
