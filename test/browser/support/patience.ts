/** A browser on a busy machine takes its time. */
jest.setTimeout(90_000);
