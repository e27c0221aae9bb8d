import { describe, expect, it } from 'vitest';
import { hashPassword, verifyPassword } from './passwords';

describe('a password', () => {
  it('is kept as argon2id with its own salt', async () => {
    const [first, second] = await Promise.all([hashPassword('correct horse'), hashPassword('correct horse')]);
    expect(first).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(first).not.toBe(second);
  });

  it('is right only for its hash, however its accents were composed', async () => {
    const hash = await hashPassword('gr\u00fc\u00dfe, zusammen');
    expect(await verifyPassword(hash, 'gru\u0308\u00dfe, zusammen')).toBe(true);
    expect(await verifyPassword(hash, 'gruße, zusammen')).toBe(false);
  });

  it('is never right where nobody has that address', async () => {
    expect(await verifyPassword(undefined, '')).toBe(false);
  });
});
