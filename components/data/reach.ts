import { ProblemError } from './problem-error';

/** Fetch, with a network that is down as a problem of its own. */
export async function reach(url: string, init: RequestInit): Promise<Response> {
  try {
    return await fetch(url, init);
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw new ProblemError('no connection');
  }
}
