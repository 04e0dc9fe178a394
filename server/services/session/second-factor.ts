import { createCipheriv, createDecipheriv, hkdfSync, randomBytes } from 'node:crypto';
import { generateSecret, generateURI, verify } from 'otplib';
import type { Transaction } from '../../database/transaction';
import { SecondFactor } from '../../entities/people.entities';
import { hasSecondFactor } from '../../repositories/people.repository';
import { conflict, Problem } from '../../errors/problem';

const STEP_SECONDS = 30;

const keyOf = (secret: string) => Buffer.from(hkdfSync('sha256', secret, '', 'second factors', 32));

/** The shared secret is stored encrypted: a copy of the database alone makes no codes. */
function seal(text: string, secret: string): string {
  const iv = randomBytes(12);
  const cipher = createCipheriv('aes-256-gcm', keyOf(secret), iv);
  const sealed = Buffer.concat([cipher.update(text, 'utf8'), cipher.final()]);
  return [iv, sealed, cipher.getAuthTag()].map((part) => part.toString('base64url')).join('.');
}

function unseal(sealed: string, secret: string): string {
  const [iv = '', body = '', tag = ''] = sealed.split('.');
  const decipher = createDecipheriv('aes-256-gcm', keyOf(secret), Buffer.from(iv, 'base64url'));
  decipher.setAuthTag(Buffer.from(tag, 'base64url'));
  return Buffer.concat([decipher.update(Buffer.from(body, 'base64url')), decipher.final()]).toString('utf8');
}

/** A new secret for the authenticator; it counts once its first code has been given. */
export async function enrolSecondFactor(
  tx: Transaction,
  user: { id: string; email: string },
  serverSecret: string,
) {
  if (await hasSecondFactor(tx.manager, user.id)) throw conflict('A second factor is in place already.');
  const secret = generateSecret();
  await tx.manager.delete(SecondFactor, { userId: user.id });
  await tx.manager.insert(SecondFactor, {
    userId: user.id,
    sealedSecret: seal(secret, serverSecret),
    lastStep: 0,
  });
  return { secret, uri: generateURI({ issuer: 'Counterpoise', label: user.email, secret }) };
}

/** Takes a code once; one step of clock skew is allowed either way. */
export async function takeCode(
  tx: Transaction,
  userId: string,
  code: string,
  serverSecret: string,
): Promise<void> {
  const factor = await tx.manager.findOneBy(SecondFactor, { userId });
  if (!factor) throw new Problem('code-refused');
  const epoch = Math.floor(tx.now.getTime() / 1000);
  const result = await verify({
    secret: unseal(factor.sealedSecret, serverSecret),
    token: code,
    epoch,
    epochTolerance: STEP_SECONDS,
  });
  if (!result.valid) throw new Problem('code-refused');
  const step = Math.floor(epoch / STEP_SECONDS) + result.delta;
  // The condition makes two uses of one code at the same moment one use.
  const used = await tx.manager
    .createQueryBuilder()
    .update(SecondFactor)
    .set({ lastStep: step, confirmedAt: factor.confirmedAt ?? tx.now })
    .where('user_id = :userId AND last_step < :step', { userId, step })
    .execute();
  if (used.affected !== 1)
    throw new Problem('code-refused', { detail: 'This code has been used. Wait for the next one.' });
}
