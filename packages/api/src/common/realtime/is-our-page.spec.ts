import { isOurPage } from './is-our-page.js';

describe('isOurPage', () => {
  const live = { publicUrl: 'https://bench.example', production: true };
  const developing = { publicUrl: 'http://localhost:3000', production: false };

  it.each([
    { origin: 'https://bench.example', ours: true },
    { origin: undefined, ours: true },
    { origin: 'http://bench.example', ours: false },
    { origin: 'https://bench.example.evil.example', ours: false },
    { origin: 'https://bench.example:8443', ours: false },
    { origin: 'https://other.example', ours: false },
    { origin: 'null', ours: false },
    { origin: '', ours: false },
  ])('in production an Origin of $origin is ours: $ours', ({ origin, ours }) => {
    expect(isOurPage({ origin, host: 'bench.example' }, live)).toBe(ours);
  });

  it('does not believe the Host header in production', () => {
    expect(isOurPage({ origin: 'https://evil.example', host: 'evil.example' }, live)).toBe(false);
  });

  it.each([
    { origin: 'http://127.0.0.1:3000', host: '127.0.0.1:3000', ours: true },
    { origin: 'http://localhost:3000', host: 'whatever', ours: true },
    { origin: 'http://evil.example', host: 'localhost:3000', ours: false },
  ])('while developing $origin at host $host is ours: $ours', ({ origin, host, ours }) => {
    expect(isOurPage({ origin, host }, developing)).toBe(ours);
  });
});
