import { screen } from '@testing-library/react';
import { renderPart } from '../testing/render-part';
import type { PlanRegion } from './drawn-kit';
import { PlanKey } from './plan-key';
import { PLAN_SHAPES, SIDE_SHAPES } from './plan-shapes';
import { PlanView } from './plan-view';
import { SideView } from './side-view';

const STABILISER: PlanRegion = { label: 'Stabiliser', fill: 'waits', count: 3 };
const REGIONS: Readonly<Record<string, PlanRegion>> = {
  'L-stab': STABILISER,
  'R-stab': STABILISER,
  fin: { label: 'Fin and rudder', fill: 'held', count: 1 },
  cabin: { label: 'Centre fuselage', fill: 'none' },
};

const names = () => screen.getAllByRole('button').map((button) => button.getAttribute('aria-label'));

it('says of each region what it is, what waits there and how much, once for both sides', () => {
  renderPart(<PlanView name="Plan of the kit" regions={REGIONS} onChoose={() => undefined} />);
  expect(screen.getByRole('group', { name: 'Plan of the kit' })).toBeInTheDocument();
  expect(names()).toEqual([
    'Centre fuselage',
    'Stabiliser, a question waits, 3 questions open',
    'Fin and rudder, held or under review, 1 question open',
  ]);
});

it.each(['{Enter}', ' '])('chooses a region with the key %p', async (key) => {
  const chosen: string[] = [];
  const { user } = renderPart(
    <PlanView name="Plan" regions={REGIONS} onChoose={(region) => chosen.push(region)} />,
  );
  screen.getByRole('button', { name: /^Fin and rudder/ }).focus();
  await user.keyboard(key);
  expect(chosen).toEqual(['fin']);
});

it('can be reached by the keyboard at every name, and at no name twice', async () => {
  const { user } = renderPart(<PlanView name="Plan" regions={REGIONS} onChoose={() => undefined} />);
  const reached: (string | null)[] = [];
  for (let press = 0; press < 4; press += 1) {
    await user.tab();
    reached.push(document.activeElement!.getAttribute('aria-label'));
  }
  expect(reached).toEqual([...names(), null]);
});

it('takes a tap on the other side, which the keyboard passes over', async () => {
  const chosen: string[] = [];
  const { user, container } = renderPart(
    <PlanView name="Plan" regions={REGIONS} onChoose={(region) => chosen.push(region)} />,
  );
  await user.click(container.querySelector('path[aria-hidden="true"][role="button"]')!);
  expect(chosen).toEqual(['R-stab']);
});

it('is pressed where it is chosen, by its fill or beside it', () => {
  const regions = {
    fin: { label: 'Fin', fill: 'driven', isChosen: true },
    cabin: { label: 'Cabin', fill: 'chosen' },
    cowl: { label: 'Cowl', fill: 'todo' },
  } as const;
  renderPart(<PlanView name="Plan" regions={regions} onChoose={() => undefined} />);
  const pressed = screen
    .getAllByRole('button', { pressed: true })
    .map((button) => button.getAttribute('aria-label'));
  expect(pressed).toEqual(['Cabin, chosen', 'Fin, driven']);
  expect(screen.getByRole('button', { name: 'Cowl, to do' })).toHaveAttribute('aria-pressed', 'false');
});

it('is a picture where nothing can be chosen', () => {
  renderPart(<SideView name="Side view of the kit" regions={REGIONS} />);
  expect(screen.getByRole('img', { name: 'Side view of the kit' })).toBeInTheDocument();
  expect(screen.queryByRole('button')).not.toBeInTheDocument();
});

it('draws the same regions under the same names in both views', () => {
  expect(Object.keys(PLAN_SHAPES)).toEqual(expect.arrayContaining(Object.keys(SIDE_SHAPES)));
  // The right-hand side and the outer wing are behind or edge on from the left.
  const unseen = Object.keys(PLAN_SHAPES).filter((region) => !SIDE_SHAPES[region]);
  expect(unseen.filter((region) => !region.startsWith('R-'))).toEqual(['L-outer', 'L-tip', 'L-aileron']);
});

it('explains the fills in words', () => {
  renderPart(<PlanKey shows={['waits', 'held', 'chosen']} />);
  for (const words of ['a question waits', 'held or under review', 'chosen'])
    expect(screen.getByText(words)).toBeInTheDocument();
});
