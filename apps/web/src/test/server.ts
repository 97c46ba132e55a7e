import { setupServer } from 'msw/node';

/** The server stand-in; each test says what it answers, and an unforeseen request fails the test. */
export const server = setupServer();
