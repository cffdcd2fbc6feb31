import { describe, expect, it } from 'vitest';
import { answerRoutes } from '@/components/views/routes/answer';
import { routeParts } from '@/components/views/routes/given-route';
import { routeLabels, routesPlate, trailsOf } from '@/components/views/routes/plate';

const CARLSBAD = 'r3r1k1/pp1nqpp1/2p2n1p/3p4/3P2b1/2NBPN2/PPQ2PPP/1R2R1K1 w - - 0 15';
const ask = { fen: CARLSBAD, of: null, man: null, route: [] } as const;

describe('the answer for a side', () => {
  const answer = answerRoutes(ask);

  it('lists every knight, bishop, rook and queen of it, what helps most first', () => {
    expect(answer.men.map(({ square }) => square).toSorted()).toEqual(['b1', 'c2', 'c3', 'd3', 'e1', 'f3']);
    const merits = answer.men.map(({ best }) => best?.merit ?? Number.NEGATIVE_INFINITY);
    expect(merits).toEqual(merits.toSorted((a, b) => b - a));
    expect(answer.men[0]?.square).toBe(answer.choices[0]?.man);
  });

  it('takes the other side where it is asked', () => {
    const black = answerRoutes({ ...ask, of: 'black' });
    expect(black.side).toBe('black');
    expect(black.men.map(({ square }) => square)).toContain('d7');
  });

  it('says nothing where there is nothing: bare pawns and kings', () => {
    const bare = answerRoutes({ ...ask, fen: '4k3/pppp4/8/8/8/8/4PPPP/4K3 w - - 0 1' });
    expect(bare.men).toEqual([]);
    expect(bare.choices).toEqual([]);
  });
});

describe('the answer for a man', () => {
  const answer = answerRoutes({ ...ask, man: 'f3' });

  it('has posts of this man only', () => {
    expect(answer.choices.length).toBeGreaterThan(3);
    expect(new Set(answer.choices.map(({ man }) => man))).toEqual(new Set(['f3']));
  });

  it('has other ways as long as the shown one and different from it', () => {
    const several = answer.choices.filter(({ others }) => others.length > 0);
    expect(several.length).toBeGreaterThan(0);
    for (const { stops, moves, others, shortest, post } of several) {
      expect(others.length).toBeLessThan(shortest);
      for (const other of others) {
        expect(other).toHaveLength(moves);
        expect(other[other.length - 1]).toBe(post);
        expect(other).not.toEqual(stops);
      }
    }
  });
});

describe('a route of one’s own', () => {
  it('is judged step by step; the plate draws the failing step as broken', () => {
    const answer = answerRoutes({ ...ask, man: 'f3', route: ['f3', 'd2', 'b3', 'c5'] });
    expect(answer.check?.steps.map(({ code }) => code)).toEqual(['fine', 'fine', 'unsafe']);
    const own = trailsOf(answer, answer.choices[0]).find(({ rank }) => rank === 'own');
    expect(own?.stops.map(({ fine }) => fine)).toEqual([true, true, false]);
    expect(routeLabels(answer, answer.choices[0]).get('c5')).toBe('c5, empty, stop 3, fails');
  });

  it('that cannot be read says why, and the posts are still there', () => {
    const answer = answerRoutes({ ...ask, route: ['zz', 'd2'] });
    expect(answer.check).toBeNull();
    expect(answer.fault).toMatch(/zz/);
    expect(answer.choices.length).toBeGreaterThan(0);
  });

  it.each([
    ['d2, b3', 'f3', ['f3', 'd2', 'b3']],
    ['f3 d2 b3', 'f3', ['f3', 'd2', 'b3']],
    ['f3-d2-b3', null, ['f3', 'd2', 'b3']],
    ['1. Nd2 2. Nb3', 'f3', ['Nd2', 'Nb3']],
    ['Nd2 Nb3', null, ['Nd2', 'Nb3']],
    ['', 'f3', []],
  ] as const)('typed as "%s" with %s chosen is read as %j', (text, man, parts) => {
    expect(routeParts(text, man)).toEqual(parts);
  });
});

describe('the plate of a way', () => {
  it('says the way in title and alt text, and names a man with its side', () => {
    const answer = answerRoutes({ ...ask, man: 'f3' });
    const choice = answer.choices.find(({ moves }) => moves === 2);
    const request = { answer, choice, man: 'f3', flipped: false, width: 640, below: 'none', id: 'p' } as const;
    const plate = routesPlate(request);
    expect(plate.title).toBe(`The knight from f3 to ${choice?.post} in 2 moves by ${choice?.stops[0]}`);
    expect(plate.alt).toContain(plate.title);
    expect(routeLabels(answer, choice).get('f3')).toBe('f3, white knight');
  });
});
