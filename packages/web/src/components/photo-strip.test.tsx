import type { Photo } from '@rivetside/shared';
import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { PhotoStrip } from './photo-strip';

const photo = (id: string, caption: string | null): Photo => ({
  id,
  width: 1600,
  height: 1200,
  bytes: 1,
  contentType: 'image/jpeg',
  caption,
  marks: [{ x: 0.5, y: 0.25, label: 'crescent' }],
  urls: { thumb: `/t/${id}`, screen: `/s/${id}`, full: `/f/${id}` },
});

// jsdom has the element without its methods.
beforeAll(() => {
  HTMLDialogElement.prototype.showModal = function showModal() {
    this.open = true;
  };
  HTMLDialogElement.prototype.close = function close() {
    this.open = false;
  };
});

it('opens a photo large with its marks, turns by arrow keys and closes by button, back where it was', async () => {
  const user = userEvent.setup();
  render(<PhotoStrip photos={[photo('a', 'Hole 7'), photo('b', null)]} />);
  const thumb = screen.getByRole('button', { name: 'Open large: Hole 7' });
  await user.click(thumb);
  expect(screen.getByRole('img', { name: 'Hole 7' })).toHaveAttribute('src', '/s/a');
  expect(screen.getByText('crescent')).toBeInTheDocument();
  await user.keyboard('{ArrowRight}');
  expect(screen.getByRole('img', { name: 'Photo 2' })).toHaveAttribute('src', '/s/b');
  await user.keyboard('{ArrowRight}');
  expect(screen.getByText('2 of 2')).toBeInTheDocument();
  await user.keyboard('{ArrowLeft}');
  await user.click(screen.getByRole('button', { name: 'Close' }));
  expect(screen.queryByRole('dialog')).not.toBeInTheDocument();
  expect(thumb).toHaveFocus();
});

it('shows nothing where there are no photos', () => {
  const { container } = render(<PhotoStrip photos={[]} />);
  expect(container).toBeEmptyDOMElement();
});
