import type { Photo } from '@rivetside/shared';
import { act, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useCallback, useState } from 'react';
import { refusedFile, type DraftPhoto } from './draft-photo';
import { PhotoAdder } from './photo-adder';
import { sendPhotos, type PhotoWire } from './send-photos';
import { usePhotoSending } from './use-photo-sending';

const picture = (name: string) => new File(['bytes'], name, { type: 'image/jpeg' });
const photoNamed = (id: string, caption: string | null = null): Photo => ({
  id,
  width: 4,
  height: 3,
  bytes: 5,
  contentType: 'image/jpeg',
  caption,
  marks: [],
  urls: { thumb: '', screen: '', full: '' },
});

interface Sent {
  readonly photo: DraftPhoto;
  readonly progress: (part: number) => void;
  readonly signal: AbortSignal;
  readonly finish: (photo: Photo) => void;
  readonly fail: (error: Error) => void;
}

/** A wire that sends only when it is told to. */
function slowWire() {
  const sent: Sent[] = [];
  const wire: PhotoWire = {
    send: (photo, { onProgress, signal }) =>
      new Promise((finish, fail) => {
        signal.addEventListener('abort', () => fail(new Error('stopped')));
        sent.push({ photo, progress: onProgress, signal, finish, fail });
      }),
    describe: jest.fn((id: string, caption: string | null) => Promise.resolve(photoNamed(id, caption))),
  };
  return { sent, wire };
}

let keys = 0;
const newKey = () => `key-${(keys += 1)}`;
class Gone extends Error {}
const reasonOf = (error: unknown) => (error instanceof Gone ? null : (error as Error).message);

function Adder({ wire, isOnline = true }: { wire: PhotoWire; isOnline?: boolean }) {
  const [photos, setPhotos] = useState<readonly DraftPhoto[]>([]);
  const handleSent = useCallback(
    (photo: DraftPhoto) => setPhotos((old) => old.map((one) => (one.key === photo.key ? photo : one))),
    [],
  );
  const sending = usePhotoSending({ photos, onSent: handleSent, isOnline, wire, reasonOf });
  return (
    <PhotoAdder
      photos={photos}
      onChange={(update) => setPhotos(update)}
      sending={sending}
      isOnline={isOnline}
      newKey={newKey}
    />
  );
}

const rows = () => within(screen.getByRole('list', { name: 'Your photos' })).queryAllByRole('listitem');
const choose = (...files: File[]) =>
  userEvent.upload(screen.getByLabelText('Choose photos', { selector: 'input' }), files);

beforeAll(() => {
  URL.createObjectURL = () => 'blob:preview';
  URL.revokeObjectURL = () => undefined;
});

it('sends two at a time, shows how far each is, and says when it is there', async () => {
  const { sent, wire } = slowWire();
  render(<Adder wire={wire} />);
  await choose(picture('a.jpg'), picture('b.jpg'), picture('c.jpg'));
  expect(sent.map(({ photo }) => photo.name)).toEqual(['a.jpg', 'b.jpg']);
  act(() => sent[0]!.progress(0.42));
  expect(screen.getByRole('progressbar', { name: 'Sending photo 1' })).toHaveAttribute('aria-valuenow', '42');
  await act(async () => sent[0]!.finish(photoNamed('p1')));
  expect(rows()[0]).toHaveTextContent('Sent; the place it was taken is removed.');
  expect(sent.map(({ photo }) => photo.name)).toEqual(['a.jpg', 'b.jpg', 'c.jpg']);
});

it('keeps a refused photo with its reason, and sends it again when it is told to', async () => {
  const { sent, wire } = slowWire();
  render(<Adder wire={wire} />);
  await choose(picture('a.jpg'));
  await act(async () => sent[0]!.fail(new Error('This picture has more than 50 megapixels.')));
  expect(screen.getByRole('alert')).toHaveTextContent('This picture has more than 50 megapixels.');
  expect(sent).toHaveLength(1);
  await userEvent.click(screen.getByRole('button', { name: 'Send again' }));
  expect(sent).toHaveLength(2);
  expect(screen.queryByRole('alert')).not.toBeInTheDocument();
});

it('stops a photo that is told to stop, and keeps it', async () => {
  const { sent, wire } = slowWire();
  render(<Adder wire={wire} />);
  await choose(picture('a.jpg'));
  await userEvent.click(screen.getByRole('button', { name: 'Stop sending photo 1' }));
  expect(sent[0]!.signal.aborted).toBe(true);
  expect(await screen.findByRole('alert')).toHaveTextContent('It is kept here and was not sent.');
});

it('sends nothing without a network, and begins when it is back', async () => {
  const { sent, wire } = slowWire();
  const { rerender } = render(<Adder wire={wire} isOnline={false} />);
  await choose(picture('a.jpg'));
  expect(rows()[0]).toHaveTextContent('sent when the network is back');
  expect(sent).toHaveLength(0);
  rerender(<Adder wire={wire} isOnline />);
  expect(sent).toHaveLength(1);
  await act(async () => sent[0]!.fail(new Gone()));
  expect(screen.queryByRole('alert')).not.toBeInTheDocument();
  expect(rows()[0]).toHaveTextContent('sent when the network is back');
});

it('takes pasted and dropped pictures, and says of other files why not', async () => {
  const { wire } = slowWire();
  render(<Adder wire={wire} />);
  fireEvent.paste(document.body, { clipboardData: { files: [picture('pasted.png')] } });
  expect(rows()).toHaveLength(1);
  const zone = screen.getByRole('group', { name: 'Add photos' });
  const files = [picture('dropped.jpg'), new File(['x'], 'notes.txt', { type: 'text/plain' })];
  const items = files.map((file) => ({ kind: 'file', type: file.type, getAsFile: () => file }));
  await act(async () => fireEvent.drop(zone, { dataTransfer: { files, items, types: ['Files'] } }));
  await waitFor(() => expect(rows()).toHaveLength(2));
  expect(screen.getByRole('alert')).toHaveTextContent('notes.txt is no picture');
});

it('puts photos in another order by button', async () => {
  const { wire } = slowWire();
  render(<Adder wire={wire} />);
  await choose(picture('a.jpg'), picture('b.jpg'));
  await userEvent.type(screen.getByRole('textbox', { name: 'What photo 2 shows' }), 'close-up');
  await userEvent.click(screen.getByRole('button', { name: 'Move close-up earlier' }));
  expect(screen.getByRole('textbox', { name: 'What photo 1 shows' })).toHaveValue('close-up');
  await userEvent.click(screen.getByRole('button', { name: 'Take out close-up' }));
  expect(rows()).toHaveLength(1);
});

it('sends only what was not sent, and writes a caption that was changed since', async () => {
  const { sent, wire } = slowWire();
  const draft = (key: string, caption: string, photo: Photo | null): DraftPhoto => ({
    key,
    name: key,
    file: picture(key),
    caption,
    sent: photo,
  });
  const there = [draft('one', 'hole 7', photoNamed('p1')), draft('two', '', photoNamed('p2'))];
  const onSent = jest.fn<void, [DraftPhoto]>();
  const done = sendPhotos(wire, [...there, draft('three', '', null)], onSent);
  await act(async () => undefined);
  expect(wire.describe).toHaveBeenCalledTimes(1);
  expect(wire.describe).toHaveBeenCalledWith('p1', 'hole 7');
  expect(sent.map(({ photo }) => photo.key)).toEqual(['three']);
  sent[0]!.finish(photoNamed('p3'));
  expect((await done).map((photo) => photo.sent!.id)).toEqual(['p1', 'p2', 'p3']);
  expect(onSent).toHaveBeenCalledTimes(3);
});

it.each([
  [{ name: 'a.jpg', type: 'image/jpeg', size: 10 }, null],
  [{ name: 'a.heic', type: '', size: 10 }, null],
  [{ name: 'a.svg', type: 'image/svg+xml', size: 10 }, /is a drawing, not a photo/],
  [{ name: 'a.jpg', type: 'image/jpeg', size: 0 }, /is empty/],
  [{ name: 'a.jpg', type: 'image/jpeg', size: 13 * 1024 * 1024 }, /has 13 MB, at most 12 MB/],
])('judges %j', (file, reason) => {
  if (reason === null) expect(refusedFile(file)).toBeNull();
  else expect(refusedFile(file)).toMatch(reason);
});
