/** The named structure: the table's own text, read token by token against the pawns. */
import { STRUCTURES, type StructureModel, type StructureSide } from '@/engine/structures';
import type { FactOf, Told } from './claim';
import { nameOf, other, type Scene, type Side, squareOf } from './scene';
import { many, named, sentences, start } from './words';

const tokens = (text = ''): string[] => text.split(' ').filter((token) => token !== '');

/** Whether the square, turned over where the colours are exchanged, is one that the token allows. */
function allows(token: string, square: number, turned: boolean): boolean {
  const name = nameOf(turned ? square ^ 56 : square);
  return token.split('|').some((part) => (part.length === 1 ? name.startsWith(part) : name === part));
}

/** Pawns that differ from one side of the model; null where its core does not stand or a bare place is taken. */
function differing(scene: Scene, side: Side, { core, bare, usual }: StructureSide, turned: boolean): number | null {
  const pawns = scene.pawns(side);
  const stands = (token: string) => pawns.some((pawn) => allows(token, pawn, turned));
  if (!tokens(core).every(stands)) return null;
  if (tokens(bare).some(stands)) return null;
  const coreFiles = tokens(core).map((token) => token.charAt(0));
  const stray = pawns.some(
    (pawn) => coreFiles.includes(nameOf(pawn).charAt(0)) && !tokens(core).some((token) => allows(token, pawn, turned)),
  );
  if (stray) return null;
  const men = tokens(core).length + tokens(usual).length;
  return Math.max(0, pawns.length - men) + tokens(usual).filter((token) => !stands(token)).length;
}

function fits(scene: Scene, model: StructureModel, leader: Side): number | null {
  const turned = leader !== model.leader;
  const white = differing(scene, turned ? 'black' : 'white', model.white, turned);
  const black = differing(scene, turned ? 'white' : 'black', model.black, turned);
  return white === null || black === null ? null : white + black;
}

/** The structure that is named, with its clause and the pawns that differ. */
export function structureTold(scene: Scene, { name, leader }: FactOf<'named-structure'>): Told {
  const model = STRUCTURES.find((each) => each.name === name);
  const differs = model ? fits(scene, model, leader) : null;
  const turned = model !== undefined && leader !== model.leader;
  const lead = (model?.lead ?? '')
    .replaceAll('{side}', named(leader))
    .replaceAll('{enemy}', named(other(leader)))
    .replace(/\{(\w\d)\}/g, (_, square: string) => (turned ? nameOf(squareOf(square) ^ 56) : square));
  return {
    facts: { name, leader, differs, lead },
    text: sentences(
      `Pawn structure: ${name}`,
      start(lead),
      differs === 0
        ? null
        : `${start(many(differs ?? 0, 'pawn'))} ${differs === 1 ? 'differs' : 'differ'} from the book form`,
    ),
    claims: { 'the core stands': differs !== null, 'two pawns at most differ': (differs ?? 9) <= 2 },
  };
}
