import { hash, verify } from '@node-rs/argon2';

/** argon2id with the OWASP minimum of 19 MiB, 2 passes, 1 lane (OWASP Password Storage Cheat Sheet). */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export function hashPassword(password: string): Promise<string> {
  return hash(password, cost);
}

/** A hash of nothing anyone knows: an unknown address takes as long as a known one. */
const nobody = hashPassword(`${Math.random()}${Date.now()}`);

export async function passwordFits(stored: string | null, password: string): Promise<boolean> {
  const fits = await verify(stored ?? (await nobody), password);
  return fits && stored !== null;
}
