import type { Millimetres } from '../units/length';
import type { Check, CheckContext } from './context';

/** Whether the cutter's centre path crosses itself: where it does, the cutter cannot enter a mouth or a gap. */
export const reachIn: Check = (context) => {
  const { fit, layout } = context;
  const { diameter } = layout.cutter;
  const mouth = narrowestMouth(context);
  const tooNarrow = mouth !== null && mouth.width < diameter - 1e-6;
  const blocked = tooNarrow || fit.crossingAt !== null;
  return {
    key: 'reach-in',
    result: blocked ? 'stop' : 'clear',
    station: 'joint',
    title: 'Room for the cutter',
    figure: mouth && { value: mouth.width, kind: 'length' },
    limit: { value: diameter, kind: 'length' },
    finding: blocked && !tooNarrow ? gapSentence(context) : mouthSentence(context, mouth),
    reason:
      'The cutter has to travel into every socket and along every gap without touching the far side.',
    remedy: blocked ? remedyFor(context, tooNarrow ? 'mouth' : 'gap') : '',
  };
};

interface Mouth {
  readonly width: Millimetres;
  readonly joint: string;
}

function narrowestMouth({ joints }: CheckContext): Mouth | null {
  return joints.reduce<Mouth | null>((narrowest, { mouth, name }) => {
    if (mouth === null || (narrowest && narrowest.width <= mouth)) return narrowest;
    return { width: mouth, joint: name };
  }, null);
}

function mouthSentence({ layout, length, cutter }: CheckContext, mouth: Mouth | null): string {
  const size = cutter(layout.cutter.diameter);
  return mouth
    ? `The narrowest socket mouth, on the ${mouth.joint}, is ${length(mouth.width)} wide; the cutter is ${size}.`
    : `No socket narrows towards its opening; the cutter is ${size}.`;
}

function gapSentence({ layout, cutter }: CheckContext): string {
  return `Between two edges of a piece there is less room than a ${cutter(layout.cutter.diameter)} cutter needs.`;
}

function remedyFor({ fit, layout, cutter }: CheckContext, blocked: 'mouth' | 'gap'): string {
  const widen = blocked === 'mouth' ? 'Widen the neck' : 'Take a larger tile or a shorter reach';
  const known = fit.largestCutter >= 0.5 && fit.largestCutter < layout.cutter.diameter;
  return `${widen}, or take a ${known ? cutter(fit.largestCutter) : 'smaller'} cutter.`;
}
