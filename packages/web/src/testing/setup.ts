import '@testing-library/jest-dom';
import { session } from '../lib/session';
import { keptOnDevice } from './kept-on-device';
import { server } from './server';

jest.mock('idb-keyval', () => jest.requireActual('./kept-on-device'));

beforeAll(() => server.listen({ onUnhandledRequest: 'error' }));
afterEach(() => {
  server.resetHandlers();
  session.end();
  keptOnDevice.clear();
  localStorage.clear();
});
afterAll(() => server.close());
