import { act, renderHook, waitFor } from '@testing-library/react';
import { keptOnDevice } from '../testing/kept-on-device';
import { dropDraft, keepDraft, readDraft, sendWhenOnline, useDraft } from './drafts';
import { Problem } from './problem';

interface Typed {
  readonly title: string;
}
const EMPTY: Typed = { title: '' };

it('gives back what an earlier page kept, and says when that was', async () => {
  await keepDraft('ask', { title: 'Hole 7' });
  const { result } = renderHook(() => useDraft('ask', EMPTY));
  expect(result.current.loaded).toBe(false);
  await waitFor(() => expect(result.current.loaded).toBe(true));
  expect(result.current.value).toEqual({ title: 'Hole 7' });
  expect(result.current.savedAt).toBeInstanceOf(Date);
});

it('keeps the last of many changes a moment after it', async () => {
  const { result } = renderHook(() => useDraft('ask', EMPTY));
  await waitFor(() => expect(result.current.loaded).toBe(true));
  act(() => result.current.set({ title: 'Hole' }));
  act(() => result.current.set(({ title }) => ({ title: `${title} 7` })));
  expect(await readDraft('ask')).toBeUndefined();
  await waitFor(() => expect(result.current.savedAt).not.toBeNull());
  expect(await readDraft('ask')).toEqual({ title: 'Hole 7' });
});

it.each(['pagehide', 'taken off the page'])('keeps at once when the page is left: %s', async (how) => {
  const { result, unmount } = renderHook(() => useDraft('ask', EMPTY));
  await waitFor(() => expect(result.current.loaded).toBe(true));
  act(() => result.current.set({ title: 'half a sen' }));
  await act(async () => {
    if (how === 'pagehide') window.dispatchEvent(new Event('pagehide'));
    else unmount();
  });
  expect(await readDraft('ask')).toEqual({ title: 'half a sen' });
});

it('does not overwrite what was typed before the kept one was read', async () => {
  await keepDraft('ask', { title: 'old' });
  const { result } = renderHook(() => useDraft('ask', EMPTY));
  act(() => result.current.set({ title: 'typed first' }));
  await act(async () => undefined);
  expect(result.current.value).toEqual({ title: 'typed first' });
});

it('leaves nothing of a dropped draft, not even by a change under way', async () => {
  const { result, unmount } = renderHook(() => useDraft('ask', EMPTY));
  await waitFor(() => expect(result.current.loaded).toBe(true));
  act(() => result.current.set({ title: 'sent already' }));
  await act(() => result.current.drop());
  unmount();
  expect(keptOnDevice.size).toBe(0);
});

describe('sending when there is a network', () => {
  it('waits without one, and sends once with the key that it began with', async () => {
    const keys: string[] = [];
    const send = (key: string) => {
      keys.push(key);
      return keys.length === 1 ? Promise.reject(Problem.noNetwork()) : Promise.resolve('sent');
    };
    const sending = sendWhenOnline('ask', send);
    await waitFor(() => expect(keys).toHaveLength(1));
    window.dispatchEvent(new Event('online'));
    await expect(sending).resolves.toBe('sent');
    expect(keys[1]).toBe(keys[0]);
    window.dispatchEvent(new Event('online'));
    expect(keys).toHaveLength(2);
    expect(keptOnDevice.size).toBe(0);
  });

  it('goes on after a closed tab with the key of before', async () => {
    const keys: string[] = [];
    void sendWhenOnline('ask', (key) => {
      keys.push(key);
      return Promise.reject(Problem.noNetwork());
    });
    await waitFor(() => expect(keys).toHaveLength(1));
    await sendWhenOnline('ask', (key) => Promise.resolve(keys.push(key)));
    expect(keys[1]).toBe(keys[0]);
  });

  it('hands over a refusal, and begins anew after it', async () => {
    const keys: string[] = [];
    const refuse = (key: string) => {
      keys.push(key);
      return Promise.reject(new Problem({ status: 400, title: 'The title is short.' }));
    };
    await expect(sendWhenOnline('ask', refuse)).rejects.toThrow('The title is short.');
    await expect(sendWhenOnline('ask', refuse)).rejects.toThrow('The title is short.');
    expect(keys[1]).not.toBe(keys[0]);
  });
});

it('forgets the key together with the draft', async () => {
  keptOnDevice.set('sending:ask', 'k');
  await keepDraft('ask', {});
  await dropDraft('ask');
  expect(keptOnDevice.size).toBe(0);
});
