import { fitCheck, type HoleCard } from '@rivetside/shared';
import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { FitCheckTable } from './fit-check-table';
import { sourceTitles } from './fit-check-figures';

/** Two holes 0.027 apart in spar and doubler, near the doubler's edge. */
function card(edge: number, u: number): HoleCard {
  return {
    layers: [
      { name: 'spar', alloy: '2024-T3 clad', thickness: 0.04, hole: { shape: 'round', diameter: 0.1285 } },
      {
        name: 'doubler',
        alloy: '2024-T3 clad',
        thickness: 0.063,
        hole: { shape: 'round', diameter: 0.1285 },
        offset: { x: 0, y: 0.027 },
        edges: [{ distance: { value: edge, u }, angle: 90 }],
      },
    ],
    rivet: { head: 'universal', alloy: 'AD', dash: 4 },
    neighbours: [{ x: -0.61, y: 0, dash: 4 }],
    flags: { crack: true },
  };
}

const show = (edge = 0.322, u = 0.005) => {
  render(<FitCheckTable check={fitCheck(card(edge, u))} units="inch" />);
  return screen.getByRole('row', { name: /^Next rivet size, AD5/ });
};

it('gives each remedy a row with its figures and what decides it', () => {
  const row = show();
  expect(within(row).getByRole('button', { name: /Final hole 0\.159 · #21/ })).toBeInTheDocument();
  expect(within(row).getByRole('button', { name: /Edge e\/D 2\.15/ })).toBeInTheDocument();
  expect(within(row).getByRole('button', { name: /Pitch p\/D 3\.90/ })).toBeInTheDocument();
  expect(screen.getByRole('row', { name: /^Leave as is.*0\.156 over 0\.132.*outside/ })).toBeInTheDocument();
});

it('opens a figure’s formula, limit, margin and source by keyboard, and closes it again', async () => {
  const user = userEvent.setup();
  const row = show();
  const edge = within(row).getByRole('button', { name: /Edge e\/D/ });
  edge.focus();
  await user.keyboard('{Enter}');
  expect(edge).toHaveAttribute('aria-expanded', 'true');
  const detail = document.getElementById(edge.getAttribute('aria-controls')!)!;
  expect(detail).toHaveTextContent(
    'e = 0.322 + 0.0135 = 0.3355; e / D = 0.3355 / 0.15625 = 2.1472, at least 2',
  );
  expect(detail).toHaveTextContent('0.15 D to spare');
  expect(detail).toHaveTextContent('US Army subcourse AL0992');
  await user.keyboard('{Enter}');
  expect(detail).not.toBeInTheDocument();
});

it('keeps to one line a remedy where there is little room, with every figure behind the result', async () => {
  const user = userEvent.setup();
  render(<FitCheckTable check={fitCheck(card(0.322, 0.005))} units="inch" compact />);
  const row = screen.getByRole('row', { name: /^Next rivet size, AD5/ });
  expect(within(row).getAllByRole('cell')).toHaveLength(1);
  await user.click(within(row).getByRole('button'));
  expect(screen.getByText(/e \/ D = 0\.3355 \/ 0\.15625 = 2\.1472, at least 2/)).toBeInTheDocument();
});

it('says how far a line is short', async () => {
  const user = userEvent.setup();
  const row = show(0.25);
  await user.click(within(row).getByRole('button', { name: /Edge e\/D/ }));
  expect(screen.getByText(/^short by 0\.31 D$/)).toBeInTheDocument();
});

it('marks what the measurement leaves too close to call, and names the tool that would settle it', async () => {
  const user = userEvent.setup();
  const row = show(0.305, 0.01);
  await user.click(within(row).getByRole('button', { name: /Edge e\/D/ }));
  expect(screen.getByText(/^Too close to call: .*would be settled/)).toBeInTheDocument();
});

it('says why to stop, what is not measured yet and that numbers are no approval', () => {
  show();
  const stop = screen.getByRole('note', { name: 'Stop and ask' });
  expect(stop).toHaveTextContent('A crack: nothing is drilled or driven before it is looked at.');
  expect(screen.getByText(/Not measured yet, and it would decide/)).toBeInTheDocument();
  expect(screen.getByText(/Inside published numbers is not approval/)).toBeInTheDocument();
});

it('never shows the short id of a source', () => {
  const check = fitCheck(card(0.322, 0.005));
  const titles = check.remedies.flatMap(({ checks }) => checks.flatMap(({ source }) => sourceTitles(source)));
  expect(titles.length).toBeGreaterThan(20);
  for (const title of titles) expect(title).not.toMatch(/(^|\s)S\d+/);
});
