/**
 * Steps of many men at once: from a set of squares, all squares that a knight or slider standing on any of them
 * attacks. Sets are two words; what a step gives is left in `spread`, so that nothing is allocated.
 */

/** The set that the last step gave. */
export const spread = { low: 0, high: 0 };

/** Masks that keep a step from running round the edge: not on the a-file, not on the a- or b-file, and so on. */
const NOT_A = 0xfefefefe | 0;
const NOT_H = 0x7f7f7f7f;
const NOT_AB = 0xfcfcfcfc | 0;
const NOT_GH = 0x3f3f3f3f;
const ALL = -1;

/** Squares a knight's leap from the set. */
export function leapFrom(low: number, high: number): void {
  spread.low = 0;
  spread.high = 0;
  shiftUp(low, high, 17, NOT_A);
  shiftUp(low, high, 15, NOT_H);
  shiftUp(low, high, 10, NOT_AB);
  shiftUp(low, high, 6, NOT_GH);
  shiftDown(low, high, 17, NOT_H);
  shiftDown(low, high, 15, NOT_A);
  shiftDown(low, high, 10, NOT_GH);
  shiftDown(low, high, 6, NOT_AB);
}

/** Squares along ranks and files from the set, up to the first that is not empty and that one too. */
export function slideStraight(low: number, high: number, emptyLow: number, emptyHigh: number): void {
  slideUp(low, high, emptyLow, emptyHigh, 8, ALL);
  slideDown(low, high, emptyLow, emptyHigh, 8, ALL);
  slideUp(low, high, emptyLow, emptyHigh, 1, NOT_A);
  slideDown(low, high, emptyLow, emptyHigh, 1, NOT_H);
}

/** Squares along diagonals from the set, up to the first that is not empty and that one too. */
export function slideDiagonal(low: number, high: number, emptyLow: number, emptyHigh: number): void {
  slideUp(low, high, emptyLow, emptyHigh, 9, NOT_A);
  slideUp(low, high, emptyLow, emptyHigh, 7, NOT_H);
  slideDown(low, high, emptyLow, emptyHigh, 9, NOT_H);
  slideDown(low, high, emptyLow, emptyHigh, 7, NOT_A);
}

function shiftUp(low: number, high: number, by: number, keep: number): void {
  spread.high |= ((high << by) | (low >>> (32 - by))) & keep;
  spread.low |= (low << by) & keep;
}

function shiftDown(low: number, high: number, by: number, keep: number): void {
  spread.low |= ((low >>> by) | (high << (32 - by))) & keep;
  spread.high |= (high >>> by) & keep;
}

/** Grows the set over empty squares towards higher numbers by one step, then thrice by two, seven in all; then one step more. */
function slideUp(low: number, high: number, emptyLow: number, emptyHigh: number, by: number, keep: number): void {
  let openLow = emptyLow & keep;
  let openHigh = emptyHigh & keep;
  let filledHigh = high | (openHigh & ((high << by) | (low >>> (32 - by))));
  let filledLow = low | (openLow & (low << by));
  openHigh &= (openHigh << by) | (openLow >>> (32 - by));
  openLow &= openLow << by;
  const two = by << 1;
  for (let turn = 0; turn < 3; turn++) {
    filledHigh |= openHigh & ((filledHigh << two) | (filledLow >>> (32 - two)));
    filledLow |= openLow & (filledLow << two);
  }
  shiftUp(filledLow, filledHigh, by, keep);
}

/** The same towards lower numbers. */
function slideDown(low: number, high: number, emptyLow: number, emptyHigh: number, by: number, keep: number): void {
  let openLow = emptyLow & keep;
  let openHigh = emptyHigh & keep;
  let filledLow = low | (openLow & ((low >>> by) | (high << (32 - by))));
  let filledHigh = high | (openHigh & (high >>> by));
  openLow &= (openLow >>> by) | (openHigh << (32 - by));
  openHigh &= openHigh >>> by;
  const two = by << 1;
  for (let turn = 0; turn < 3; turn++) {
    filledLow |= openLow & ((filledLow >>> two) | (filledHigh << (32 - two)));
    filledHigh |= openHigh & (filledHigh >>> two);
  }
  shiftDown(filledLow, filledHigh, by, keep);
}
