import {
  createHash,
  createPrivateKey,
  createPublicKey,
  generateKeyPairSync,
  sign,
  verify,
} from 'node:crypto';
import { readOrMakeSecret } from '../common/secret-file.js';

/** The Ed25519 key that signs checkpoints. */
export interface SigningKey {
  readonly keyId: string;
  readonly publicPem: string;
  /** Signature in base64. */
  sign(text: string): string;
}

/** The first 16 hex digits of the SHA-256 of the public key's SPKI form. */
export function keyIdOf(publicPem: string): string {
  const spki = createPublicKey(publicPem).export({ type: 'spki', format: 'der' });
  return createHash('sha256').update(spki).digest('hex').slice(0, 16);
}

/** Reads the key from a file that only the server's account may read; makes one the first time. */
export function loadSigningKey(file: string): SigningKey {
  const pem = readOrMakeSecret(file, () =>
    generateKeyPairSync('ed25519').privateKey.export({ type: 'pkcs8', format: 'pem' }).toString(),
  );
  const key = createPrivateKey(pem);
  const publicPem = createPublicKey(key).export({ type: 'spki', format: 'pem' }).toString();
  return {
    keyId: keyIdOf(publicPem),
    publicPem,
    sign: (text) => sign(null, Buffer.from(text), key).toString('base64'),
  };
}

export function signatureHolds(text: string, signature: string, publicPem: string): boolean {
  return verify(null, Buffer.from(text), createPublicKey(publicPem), Buffer.from(signature, 'base64'));
}
