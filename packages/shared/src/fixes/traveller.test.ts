import type { HoleCard } from '../fit-check/card-fields.js';
import type { RemedyCheck } from '../fit-check/hole-card.schema.js';
import { FIX_KINDS, MISHAPS } from '../words/words.js';
import { proposeFixSchema } from './fix.schema.js';
import { rivetCallOut, travellerFor } from './traveller.js';

const card: HoleCard = {
  layers: [{ thickness: 0.04 }, { thickness: 0.063 }],
  rivet: { head: 'universal', alloy: 'AD', dash: 4 },
};
const nextSize: RemedyCheck = {
  kind: 'nextSize',
  verdict: 'marginal',
  finalHole: { diameter: 0.159, drill: '#21' },
  rivet: { head: 'universal', alloy: 'AD', dash: 5, lengthDash: 5.5 },
  checks: [],
  centre: null,
  remarks: [],
};

describe('rivetCallOut', () => {
  it.each([
    { rivet: { head: 'universal' as const, alloy: 'AD', dash: 4, lengthDash: 4.5 }, callOut: '470 AD4-4.5' },
    { rivet: { head: 'flush' as const, alloy: 'AD', dash: 3, lengthDash: 3 }, callOut: '426 AD3-3' },
    { rivet: { head: null, alloy: null, dash: 5, lengthDash: null }, callOut: '5' },
  ])('reads $callOut', ({ rivet, callOut }) => expect(rivetCallOut(rivet)).toBe(callOut));
});

describe('travellerFor', () => {
  it('names drill, rivet and the shop head of the next size', () => {
    const { summary, operations, conditions } = travellerFor({
      kind: 'nextSize',
      mishap: 'misalignedHole',
      card,
      remedy: nextSize,
    });
    const text = operations.map((operation) => operation.text).join('\n');
    expect(summary).toBe('Open to #21 and drive one AD5');
    expect(text).toContain('#21 (0.159)');
    expect(text).toContain('470 AD5-5.5');
    // S13, S19: 1.5 D by 0.5 D of a 5/32 rivet
    expect(text).toContain('0.234 × 0.078');
    // S9: below 1.3 D or 0.3 D it is replaced
    expect(text).toContain('0.203 × 0.047');
    expect(conditions).toContain('a photo of the clean hole before driving');
  });

  it('asks that a control surface is balanced again', () => {
    const surface = { ...card, flags: { controlSurface: true } };
    const { conditions } = travellerFor({ kind: 'leave', mishap: 'badRivet', card: surface, remedy: null });
    expect(conditions).toContain('balance the control surface again before it is hung');
  });

  it('warns of chromate wherever primer is touched, and of air wherever a set is changed', () => {
    for (const kind of FIX_KINDS) {
      const { operations } = travellerFor({ kind, mishap: 'misalignedHole', card, remedy: null });
      for (const { text, caution } of operations) {
        if (/primer|prime/.test(text)) expect(caution).toMatch(/chromate/i);
        if (/^Set the rivet/.test(text)) expect(caution).toMatch(/air hose off/i);
      }
    }
  });

  it('makes a fix that may be proposed as it stands, for every kind and trouble', () => {
    for (const kind of FIX_KINDS)
      for (const mishap of MISHAPS)
        for (const given of [card, null]) {
          const fix = { kind, ...travellerFor({ kind, mishap, card: given, remedy: null }) };
          expect(proposeFixSchema.safeParse(fix).error).toBeUndefined();
        }
  });
});
