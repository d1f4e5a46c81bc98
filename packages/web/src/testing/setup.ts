import '@testing-library/jest-dom';
import { cleanup, configure } from '@testing-library/react';
import { session } from '../lib/session';
import { keptOnDevice } from './kept-on-device';
import { server } from './server';

jest.mock('idb-keyval', () => jest.requireActual('./kept-on-device'));

// The first page of a file is compiled while it is waited for, and a slow machine is no failure.
configure({ asyncUtilTimeout: 10_000 });

beforeAll(() => server.listen({ onUnhandledRequest: 'error' }));
afterEach(() => {
  // Taken down first: what ends after it has no page to tell.
  cleanup();
  server.resetHandlers();
  session.end();
  keptOnDevice.clear();
  localStorage.clear();
});
afterAll(() => server.close());
