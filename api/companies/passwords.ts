import { hash, verify } from '@node-rs/argon2';

/** Argon2id; parameters after the OWASP Password Storage Cheat Sheet (2024): 19 MiB, 2 passes, 1 lane. From memory. */
const parameters = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export const hashPassword = (password: string): Promise<string> => hash(password, parameters);

export const verifyPassword = (stored: string, password: string): Promise<boolean> => verify(stored, password);

let decoy: Promise<string> | undefined;

/** A hash nobody's password has, so that an unknown address costs the time of a known one. */
export const decoyHash = (): Promise<string> => (decoy ??= hashPassword('no account has this password'));
