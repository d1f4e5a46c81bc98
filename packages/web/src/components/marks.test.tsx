import { BASIS_WORDS, type Basis, type QuestionState, STATE_WORDS, type StampState } from '@rivetside/shared';
import { screen } from '@testing-library/react';
import { renderPart } from '../testing/render-part';
import { initialsOf, MarginNote } from './margin-note';
import { RivetLine } from './rivet-line';
import { Stamp } from './stamp';
import { StateWord } from './state-word';

const STAMP = {
  stampNumber: 'M-08',
  discipline: 'sheetMetal',
  basis: 'drawingNote',
  state: 'live',
} as const;

const stamped = (facts: { basis?: Basis; state?: StampState }) =>
  renderPart(<Stamp stamp={{ ...STAMP, ...facts }} day="14 May 25" who="Dezso Harrowmeck" />);

describe('a stamp', () => {
  it('says its number, whose it is, the discipline, what it rests on and the day', () => {
    stamped({});
    expect(
      screen.getByRole('img', {
        name: 'Stamp M-08, Dezso Harrowmeck, sheet metal, drawing note, 14 May 25',
      }),
    ).toBeInTheDocument();
  });

  it.each(Object.keys(BASIS_WORDS) as Basis[])('tells %s by a border of its own', (basis) => {
    const { container } = stamped({ basis });
    expect(container.querySelectorAll(`[data-basis="${basis}"]`)).toHaveLength(1);
    // The double line of what the kit maker wrote.
    expect(container.querySelectorAll('svg > path')).toHaveLength(basis === 'kitMakerReply' ? 2 : 1);
  });

  it('punches the first word of a long discipline and says all of it', () => {
    renderPart(<Stamp stamp={{ ...STAMP, discipline: 'engine' }} day="14 May 25" who="Dezso Harrowmeck" />);
    expect(screen.getByText('ENGINE')).toBeInTheDocument();
    expect(screen.getByRole('img')).toHaveAccessibleName(/engine and firewall forward/);
  });

  it.each([
    ['held', 'HELD'],
    ['expired', 'RAN OUT'],
    ['withdrawn', 'WITHDRAWN'],
  ] as const)('is struck with a word when it is %s', (state, word) => {
    const { container } = stamped({ state });
    expect(container.querySelector('.strike')).toBeInTheDocument();
    expect(screen.getByText(word)).toBeInTheDocument();
    expect(screen.getByRole('img')).toHaveAccessibleName(expect.stringContaining(word.toLowerCase()));
  });

  it('is not struck while it counts', () => {
    const { container } = stamped({});
    expect(container.querySelector('.strike')).toBeNull();
  });
});

it.each(Object.keys(STATE_WORDS) as QuestionState[])('says %s in words', (state) => {
  renderPart(<StateWord state={state} />);
  expect(screen.getByText(STATE_WORDS[state])).toHaveAttribute('data-state', state);
});

it('draws a hole for each step and says in words how far it has come', () => {
  const { container } = renderPart(
    <RivetLine states={['driven', 'driven', 'pinned', 'todo']} label="2 of 4 steps driven, 1 pinned" />,
  );
  expect(screen.getByRole('img', { name: '2 of 4 steps driven, 1 pinned' })).toBeInTheDocument();
  const holes = [...container.querySelectorAll('circle')].map(({ className }) => className.baseVal);
  expect(holes).toEqual(['driven', 'shine', 'driven', 'shine', 'pinned', 'todo']);
});

it.each([
  ['Ottoline Brackwater', 'OB'],
  ['Dezso van der Harrowmeck', 'DH'],
  ['Wilf', 'W'],
  ['', ''],
])('signs %p as %p', (name, initials) => {
  expect(initialsOf(name)).toBe(initials);
});

it('signs a note with initials that are not read out beside the name', () => {
  renderPart(
    <MarginNote name="Ottoline Brackwater" when="10 May, 20:52">
      Hole 7 shows a crescent.
    </MarginNote>,
  );
  expect(screen.getByText('OB')).toHaveAttribute('aria-hidden', 'true');
  expect(screen.getByText('Ottoline Brackwater')).toBeInTheDocument();
});
