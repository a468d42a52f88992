import { solveLevel, type Level } from './solve-level';

type Sds = { readonly stateSd: number; readonly extraSd: number };
/** A move in steps of the stencil. */
type Move = { readonly x: number; readonly y: number };

const MOST_ROUNDS = 40;
const SHRINK = 0.1;
/** In steps of the first stencil, which are about a standard error wide. */
const PRECISE = 0.005;
const AS_ZERO = 0.001;

/**
 * The standard deviations with the largest restricted likelihood near a starting point, by Newton steps on a stencil
 * of nine. The likelihood is an even function of both, so a maximum at 0 is an ordinary one.
 */
export function restrictedMaximum(level: Level, start: Sds, firstSteps: Sds): Sds {
  let { stateSd, extraSd } = start;
  let scale = 1;
  const valueAt = ({ x, y }: Move) => {
    const state = stateSd + x * scale * firstSteps.stateSd;
    const extra = extraSd + y * scale * firstSteps.extraSd;
    solveLevel(level, state * state, extra * extra);
    return level.logLikelihoodFlat;
  };
  for (let round = 0; round < MOST_ROUNDS && scale > PRECISE; round += 1) {
    const values = stencil.map(valueAt);
    const newton = newtonMove(values);
    const moves = newton ? [...stencil, newton] : stencil;
    if (newton) values.push(valueAt(newton));
    const move = moves[values.indexOf(Math.max(...values))]!;
    stateSd = Math.abs(stateSd + move.x * scale * firstSteps.stateSd);
    extraSd = Math.abs(extraSd + move.y * scale * firstSteps.extraSd);
    if (Math.abs(move.x) < 1 && Math.abs(move.y) < 1) scale *= SHRINK;
  }
  const settled = (sd: number, step: number) => (sd < AS_ZERO * step ? 0 : sd);
  return {
    stateSd: settled(stateSd, firstSteps.stateSd),
    extraSd: settled(extraSd, firstSteps.extraSd),
  };
}

const stencil: readonly Move[] = [-1, 0, 1].flatMap((y) => [-1, 0, 1].map((x) => ({ x, y })));

/** The top of the quadratic surface through the stencil, at most one step away; null if it has none. */
function newtonMove(values: readonly number[]): Move | null {
  const at = (x: number, y: number) => values[(y + 1) * 3 + x + 1]!;
  const slopeX = (at(1, 0) - at(-1, 0)) / 2;
  const slopeY = (at(0, 1) - at(0, -1)) / 2;
  const bendX = at(1, 0) - 2 * at(0, 0) + at(-1, 0);
  const bendY = at(0, 1) - 2 * at(0, 0) + at(0, -1);
  const twist = (at(1, 1) - at(1, -1) - at(-1, 1) + at(-1, -1)) / 4;
  const determinant = bendX * bendY - twist * twist;
  if (!(bendX < 0 && determinant > 0)) return null;
  const x = (twist * slopeY - bendY * slopeX) / determinant;
  const y = (twist * slopeX - bendX * slopeY) / determinant;
  const stretch = Math.max(1, Math.abs(x), Math.abs(y));
  return { x: x / stretch, y: y / stretch };
}
