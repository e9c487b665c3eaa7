import { ProblemError } from './problem-error';

type Waiting = { goOn: () => void; giveUp: (error: ProblemError) => void };

let waiting: Waiting[] = [];
let listeners: (() => void)[] = [];
let asked = false;

const tell = () => listeners.forEach((each) => each());

/** Waits while the person signs in again over the page; every request that met a 401 waits here, then goes once more. */
export function whenSignedInAgain(error: ProblemError): Promise<void> {
  if (listeners.length === 0) return Promise.reject(error);
  return new Promise((goOn, giveUp) => {
    waiting = [...waiting, { goOn, giveUp }];
    asked = true;
    tell();
  });
}

/** Asks for a new sign-in although no request waits for it. */
export function askToSignIn() {
  asked = true;
  tell();
}

export function signedInAgain() {
  const goingOn = waiting;
  waiting = [];
  asked = false;
  tell();
  goingOn.forEach((each) => each.goOn());
}

export function gaveUpSigningIn() {
  const givenUp = waiting;
  waiting = [];
  asked = false;
  tell();
  givenUp.forEach((each) => each.giveUp(new ProblemError('not signed in', { status: 401 })));
}

export function subscribeSignedOut(listener: () => void) {
  listeners = [...listeners, listener];
  return () => {
    listeners = listeners.filter((each) => each !== listener);
  };
}

export const isSignInAsked = () => asked;
