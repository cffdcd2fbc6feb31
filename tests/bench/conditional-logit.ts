/**
 * The choice among a position's candidates as a conditional logit: the chance of a candidate grows with the weighted
 * sum of its differences. Fitted by plain gradient steps on standardised columns, each weight kept to its sign.
 */

/** Candidates of all positions in rows; a position's rows lie together. */
export interface ChoiceData {
  readonly width: number;
  readonly rows: Float64Array;
  /** First row of each position, and one past the last of all. */
  readonly starts: readonly number[];
  /** 1 for rows that are right. */
  readonly right: Uint8Array;
  /** Weight of each position. */
  readonly importance: readonly number[];
}

export interface FitOptions {
  /** Positions to fit on, by their place. */
  readonly positions: readonly number[];
  /** -1 or 1: the sign to which a weight is kept; 0 keeps it at nothing. */
  readonly signs: readonly number[];
  readonly steps: number;
  /** Pull of each standardised weight towards 0. */
  readonly ridge: number;
}

/** Weights of the columns. */
export function fitChoice(data: ChoiceData, { positions, signs, steps, ridge }: FitOptions): Float64Array {
  const { width } = data;
  const scale = columnScale(data);
  const weights = new Float64Array(width);
  const speed = new Float64Array(width);
  const slope = new Float64Array(width);
  const rate = 0.5;
  for (let step = 0; step < steps; step++) {
    const total = gradient(data, positions, weights, scale, slope);
    for (let column = 0; column < width; column++) {
      const pull = (slope[column]! - 2 * ridge * weights[column]!) / total;
      speed[column] = 0.9 * speed[column]! + rate * pull;
      const next = weights[column]! + speed[column]!;
      const sign = signs[column] ?? 0;
      weights[column] = sign === 0 || next * sign < 0 ? 0 : next;
      if (weights[column] === 0) speed[column] = 0;
    }
  }
  return weights.map((weight, column) => weight / scale[column]!);
}

function columnScale({ rows, width }: ChoiceData): Float64Array {
  const count = rows.length / width;
  const scale = new Float64Array(width);
  for (let column = 0; column < width; column++) {
    let sum = 0;
    let squares = 0;
    for (let at = column; at < rows.length; at += width) {
      sum += rows[at]!;
      squares += rows[at]! ** 2;
    }
    scale[column] = Math.sqrt(Math.max(squares / count - (sum / count) ** 2, 1e-9));
  }
  return scale;
}

/** Fills the slope of the log likelihood and gives back the sum of importances. */
function gradient(
  { rows, width, starts, right, importance }: ChoiceData,
  positions: readonly number[],
  weights: Float64Array,
  scale: Float64Array,
  slope: Float64Array,
): number {
  slope.fill(0);
  let total = 0;
  for (const position of positions) {
    const begin = starts[position]!;
    const end = starts[position + 1]!;
    const chances = new Float64Array(end - begin);
    let sum = 0;
    let rightSum = 0;
    for (let row = begin; row < end; row++) {
      let score = 0;
      for (let column = 0; column < width; column++)
        score += (weights[column]! / scale[column]!) * rows[row * width + column]!;
      const chance = Math.exp(Math.min(score, 300));
      chances[row - begin] = chance;
      sum += chance;
      if (right[row] === 1) rightSum += chance;
    }
    const much = importance[position]!;
    total += much;
    for (let row = begin; row < end; row++) {
      const chance = chances[row - begin]!;
      const push = much * ((right[row] === 1 ? chance / Math.max(rightSum, 1e-300) : 0) - chance / sum);
      for (let column = 0; column < width; column++)
        slope[column]! += (push * rows[row * width + column]!) / scale[column]!;
    }
  }
  return total;
}

/** Place of the best right row of a position under the weights, from 1. */
export function placeUnder(
  { rows, width, starts, right }: ChoiceData,
  weights: Float64Array,
  position: number,
): number {
  const scores: { score: number; right: boolean }[] = [];
  for (let row = starts[position]!; row < starts[position + 1]!; row++) {
    let score = 0;
    for (let column = 0; column < width; column++) score += weights[column]! * rows[row * width + column]!;
    scores.push({ score, right: right[row] === 1 });
  }
  const best = Math.max(...scores.filter((each) => each.right).map(({ score }) => score));
  return 1 + scores.filter(({ score }) => score > best).length;
}
