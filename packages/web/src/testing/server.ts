import { setupServer } from 'msw/node';

/** The server of the tests: whatever a page asks for has to be answered by the test or the test fails. */
export const server = setupServer();
