import { fitCheck, type HoleCard } from '@rivetside/shared';
import { fireEvent, render, screen, within } from '@testing-library/react';
import { HoleDrawing } from './hole-drawing';
import { HoleDrawingMini } from './hole-drawing-mini';

function doublerCard(): HoleCard {
  return {
    layers: [
      {
        name: 'spar',
        thickness: 0.04,
        hole: { shape: 'round', diameter: 0.1285 },
        edges: [{ distance: { value: 0.41, u: 0.005 }, angle: 270 }],
      },
      {
        name: 'doubler',
        thickness: 0.063,
        hole: { shape: 'round', diameter: 0.1285 },
        offset: { x: 0, y: { value: 0.027, u: 0.002 } },
        edges: [{ distance: { value: 0.322, u: 0.005 }, angle: 90 }],
      },
    ],
    rivet: { head: 'universal', alloy: 'AD', dash: 4 },
    neighbours: [{ x: -0.61, y: 0, dash: 4 }],
  };
}

function draw(onChange?: (card: HoleCard) => void, units: 'inch' | 'mm' = 'inch') {
  const card = doublerCard();
  render(<HoleDrawing card={card} check={fitCheck(card)} units={units} onChange={onChange} />);
}

it('shows every dimension, and lists the same in words', () => {
  draw();
  const drawing = screen.getByRole('img', { name: 'Hole card, drawn to scale' });
  for (const text of ['off 0.027', '0.610', 'e 0.336 · 2.1 D']) {
    expect(within(drawing).getByText(text)).toBeInTheDocument();
  }
  const words = screen.getByText('The drawing in words').closest('details')!;
  expect(words).toHaveTextContent('hole 0.027 ± 0.002 above the first hole; edge above 0.322 ± 0.005');
});

it('has no points to move where nobody listens', () => {
  draw();
  expect(screen.queryByRole('slider')).not.toBeInTheDocument();
});

it('moves a point by a thousandth with an arrow key, by a hundredth with Shift, and keeps its error', () => {
  const onChange = jest.fn<void, [HoleCard]>();
  draw(onChange);
  const hole = screen.getByRole('slider', { name: /Hole in doubler/ });
  fireEvent.keyDown(hole, { key: 'ArrowUp' });
  fireEvent.keyDown(hole, { key: 'ArrowRight', shiftKey: true });
  const [up, right] = onChange.mock.calls.map(([card]) => card.layers[1]!.offset);
  expect(up).toEqual({ x: 0, y: { value: 0.028, u: 0.002 } });
  expect(right).toEqual({ x: { value: 0.01, u: 0.002 }, y: { value: 0.027, u: 0.002 } });
});

it('moves an edge along its own direction alone', () => {
  const onChange = jest.fn<void, [HoleCard]>();
  draw(onChange);
  const edge = screen.getByRole('slider', { name: /Edge of spar, below/ });
  expect(edge).toHaveAttribute('aria-valuetext', '0.410 in from the hole');
  fireEvent.keyDown(edge, { key: 'ArrowDown', shiftKey: true });
  fireEvent.keyDown(edge, { key: 'Tab' });
  expect(onChange).toHaveBeenCalledTimes(1);
  expect(onChange.mock.calls[0]![0].layers[0]!.edges![0]!.distance).toEqual({ value: 0.42, u: 0.005 });
});

// jsdom has no pointer events; a mouse event with the id of a pointer is one.
class PointerStub extends MouseEvent {
  readonly pointerId: number;
  constructor(type: string, init: PointerEventInit = {}) {
    super(type, init);
    this.pointerId = init.pointerId ?? 0;
  }
}

it('drags a neighbour from where it was held, however often it moves on the way', () => {
  Object.assign(window, { PointerEvent: PointerStub });
  const onChange = jest.fn<void, [HoleCard]>();
  draw(onChange);
  const next = screen.getByRole('slider', { name: /Next rivet, left/ });
  fireEvent.pointerDown(next, { pointerId: 1, clientX: 100, clientY: 100 });
  fireEvent.pointerMove(next, { pointerId: 1, clientX: 60, clientY: 100 });
  fireEvent.pointerMove(next, { pointerId: 1, clientX: 100, clientY: 100 });
  fireEvent.pointerUp(next, { pointerId: 1 });
  fireEvent.pointerMove(next, { pointerId: 1, clientX: 300, clientY: 100 });
  const places = onChange.mock.calls.map(([card]) => card.neighbours![0]!.x);
  expect(places).toHaveLength(2);
  expect(places[0]).toBeLessThan(-0.61);
  expect(places[1]).toBe(-0.61);
});

it('speaks millimetres to whoever works in them', () => {
  draw(undefined, 'mm');
  expect(screen.getByText('off 0.69')).toBeInTheDocument();
  expect(screen.getByText('grid 2 mm')).toBeInTheDocument();
});

it('draws two cards small at one scale, without labels', () => {
  const { container } = render(
    <>
      <HoleDrawingMini card={doublerCard()} label="one" />
      <HoleDrawingMini card={{ ...doublerCard(), neighbours: [{ x: 3, y: 0, dash: 4 }] }} label="other" />
    </>,
  );
  expect(screen.getAllByRole('img').map((svg) => svg.getAttribute('aria-label'))).toEqual(['one', 'other']);
  expect(container.querySelector('text')).toBeNull();
  const [one, other] = [...container.querySelectorAll('svg')].map((svg) =>
    [...svg.querySelectorAll('circle')].at(-1)!.getAttribute('r')!,
  );
  expect(one).toBe(other);
});
