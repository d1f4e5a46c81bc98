import { hash } from '@node-rs/argon2';
import { Passwords } from './passwords.js';

describe('passwords', () => {
  const passwords = new Passwords();
  beforeAll(() => passwords.onModuleInit());

  // OWASP Password Storage Cheat Sheet, argon2id: m=19456 (19 MiB), t=2, p=1
  it('are kept as argon2id with 19 MiB, two passes and one lane, salted', async () => {
    const [one, two] = [
      await passwords.hash('maple copper lantern'),
      await passwords.hash('maple copper lantern'),
    ];
    expect(one).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(two).not.toBe(one);
  });

  it('match what was hashed and nothing else', async () => {
    const kept = await passwords.hash('maple copper lantern');
    expect(await passwords.matches('maple copper lantern', kept)).toBe(true);
    expect(await passwords.matches('maple copper lanterns', kept)).toBe(false);
  });

  it('match nobody where there is no account, not even with the stand-in', async () => {
    expect(await passwords.matches('nobody has this password', null)).toBe(false);
  });

  it('match nothing where what is kept is no hash', async () => {
    expect(await passwords.matches('anything', 'no password')).toBe(false);
  });

  it('still match a hash made with other parameters', async () => {
    const older = await hash('maple copper lantern', { memoryCost: 8, timeCost: 1, parallelism: 1 });
    expect(await passwords.matches('maple copper lantern', older)).toBe(true);
  });
});
