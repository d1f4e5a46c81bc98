import type { HoleLine, Part, Section, Step } from '@rivetside/shared';
import {
  aboutWholeBuild,
  atPart,
  atStep,
  blankDraft,
  fittingLines,
  inSection,
  onHoleLine,
  withMishap,
} from './ask-draft';

const nowhere = { ...blankDraft().place, kitId: 'kit' };
const line = (id: string, stepId: string | null, ...parts: string[]) =>
  ({ id, sectionId: 'stab', stepId, stack: parts.map((partId) => ({ partId })) }) as HoleLine;
const section = {
  id: 'stab',
  holeLines: [
    line('hl-1', 'step-1', 'spar', 'rib'),
    line('hl-3', 'step-3', 'spar', 'doubler'),
    line('hl-9', null, 'skin'),
  ],
} as Section;
const step = (id: string, sectionId = 'stab') => ({ id, sectionId }) as Step;
const part = (id: string, sectionId = 'stab') => ({ id, sectionId }) as Part;

it('fills section and step in from a hole line, and keeps a part that it goes through', () => {
  const place = onHoleLine({ ...nowhere, sectionId: 'stab', partId: 'doubler' }, section.holeLines[1]!);
  expect(place).toMatchObject({ sectionId: 'stab', stepId: 'step-3', partId: 'doubler', holeLineId: 'hl-3' });
  expect(onHoleLine(place, section.holeLines[0]!)).toMatchObject({
    partId: null,
    stepId: 'step-1',
    holes: '',
  });
});

it('keeps the hole numbers of the line that stays', () => {
  const place = { ...onHoleLine(nowhere, section.holeLines[1]!), holes: '7', repeat: 2 };
  expect(onHoleLine(place, section.holeLines[1]!)).toMatchObject({ holes: '7', repeat: 2 });
});

it('fills the section in from a part found by its number', () => {
  expect(atPart(nowhere, part('spar'), undefined)).toMatchObject({ sectionId: 'stab', partId: 'spar' });
});

it('lets a hole line go that does not go through the part or lies in another step', () => {
  const place = onHoleLine(nowhere, section.holeLines[1]!);
  expect(atPart(place, part('rib'), section).holeLineId).toBeNull();
  expect(atPart(place, part('spar'), section).holeLineId).toBe('hl-3');
  expect(atStep(place, step('step-1'), section).holeLineId).toBeNull();
  expect(atStep(place, step('step-3'), section).holeLineId).toBe('hl-3');
});

it('keeps nothing of the old section in a new one, nor of any in the whole build', () => {
  const place = onHoleLine(nowhere, section.holeLines[1]!);
  expect(inSection(place, 'fin')).toEqual({ ...nowhere, sectionId: 'fin' });
  expect(aboutWholeBuild(place, true)).toEqual({ ...nowhere, wholeBuild: true });
});

it('offers the hole lines of the step and through the part', () => {
  const at = (change: object) => fittingLines(section, { ...nowhere, ...change }).map(({ id }) => id);
  expect(at({})).toEqual(['hl-1', 'hl-3', 'hl-9']);
  expect(at({ stepId: 'step-3' })).toEqual(['hl-3', 'hl-9']);
  expect(at({ partId: 'spar' })).toEqual(['hl-1', 'hl-3']);
});

it('brings the usual discipline along with the mishap, but leaves one that was chosen', () => {
  const first = withMishap(blankDraft(), 'badRivet');
  expect(first.discipline).toBe('riveting');
  expect(withMishap(first, 'sealantOrLeak').discipline).toBe('sealant');
  const chosen = { ...first, discipline: 'corrosion' as const, isDisciplineChosen: true };
  expect(withMishap(chosen, 'sealantOrLeak').discipline).toBe('corrosion');
});
