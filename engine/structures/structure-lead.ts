/** The lead of a structure in words, for the colours as they stand. */
import type { StructureMatch } from './name-structure';

const SIDE_WORDS = { white: 'White', black: 'Black' } as const;

/**
 * The clause that says what the structure means, without a full stop: sides named, squares turned over where
 * the colours are exchanged.
 */
export function structureLead({ model, side, reversed }: StructureMatch): string {
  return model.lead.replace(/\{(\w+)\}/g, (_, word: string) => {
    if (word === 'side') return SIDE_WORDS[side];
    if (word === 'enemy') return SIDE_WORDS[side === 'white' ? 'black' : 'white'];
    return reversed ? `${word.charAt(0)}${9 - Number(word.charAt(1))}` : word;
  });
}
