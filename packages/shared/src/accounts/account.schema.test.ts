import {
  changeMeSchema,
  emailSchema,
  nameSchema,
  newPasswordSchema,
  resetPasswordSchema,
  signInSchema,
  signUpSchema,
} from './account.schema.js';

const faultOf = (result: { error?: { issues: { message: string }[] } | undefined }) =>
  result.error?.issues.map(({ message }) => message).join(' ');

describe('an e-mail address', () => {
  it.each([
    ['wenna@test.example', 'wenna@test.example'],
    ['  Wenna.Trevose@Test.Example ', 'wenna.trevose@test.example'],
    ['w+bench@sub.test.example', 'w+bench@sub.test.example'],
  ])('%s is kept as %s', (given, kept) => expect(emailSchema.parse(given)).toBe(kept));

  it.each([
    '',
    'wenna',
    'wenna@',
    '@test.example',
    'wenna@test',
    'a@b.example, c@d.example',
    'Wenna <a@b.example>',
    'a@b.example\nBcc: c@d.example',
    'a b@test.example',
    `${'a'.repeat(250)}@b.example`,
    7,
    null,
    ['a@b.example'],
  ])('%j is none', (given) => {
    const result = emailSchema.safeParse(given);
    expect(result.success).toBe(false);
    expect(faultOf(result)).toMatch(/e-mail address/);
  });
});

describe('a new password', () => {
  it.each([
    { length: 11, ok: false },
    { length: 12, ok: true },
    { length: 128, ok: true },
    { length: 129, ok: false },
  ])('of $length characters is taken: $ok', ({ length, ok }) => {
    const result = newPasswordSchema.safeParse('ab '.repeat(50).slice(0, length));
    expect(result.success).toBe(ok);
    if (!ok) expect(faultOf(result)).toMatch(/A password has at (least 12|most 128) characters\./);
  });

  it('is kept as typed, spaces and all', () => {
    expect(newPasswordSchema.parse('  Maple Copper  ')).toBe('  Maple Copper  ');
  });
});

describe('a name', () => {
  it.each(['Wenna Trevose', 'Ó Briain', '李 小龙', "D'Arcy-Penrose", 'Al'])('%s is one', (name) =>
    expect(nameSchema.parse(name)).toBe(name),
  );

  it.each([
    '',
    ' ',
    'W',
    'Wenna\r\nBcc: x@y.example',
    'Wenna\u2028Trevose',
    'Wenna\u0000',
    '<script>',
    'see https://cheap.example',
    'WWW.cheap.example',
    'x'.repeat(81),
    7,
  ])('%j is none', (name) => expect(nameSchema.safeParse(name).success).toBe(false));
});

describe('what is sent', () => {
  const signUp = { email: 'a@test.example', password: 'maple copper', name: 'Wenna' };

  it('to sign up carries nothing besides', () => {
    expect(signUpSchema.safeParse(signUp).success).toBe(true);
    expect(signUpSchema.safeParse({ ...signUp, siteRole: 'siteAdmin' }).success).toBe(false);
  });

  it('to sign in may be any password, so that the answer never says what one must look like', () => {
    expect(signInSchema.safeParse({ email: 'a@test.example', password: 'x' }).success).toBe(true);
    expect(signInSchema.safeParse({ email: 'a@test.example', password: '' }).success).toBe(false);
    expect(signInSchema.safeParse({ email: 'a@test.example', password: 'x'.repeat(1_001) }).success).toBe(
      false,
    );
  });

  it('to set a password anew needs a whole link', () => {
    const result = resetPasswordSchema.safeParse({ token: 'short', password: 'maple copper' });
    expect(faultOf(result)).toBe('The link is not whole.');
  });

  it.each([
    { zone: 'Europe/London', ok: true },
    { zone: 'UTC', ok: true },
    { zone: 'America/Argentina/Buenos_Aires', ok: true },
    { zone: 'Bodmin/Moor', ok: false },
    { zone: '', ok: false },
    { zone: '../etc', ok: false },
  ])('as a zone $zone is taken: $ok', ({ zone, ok }) =>
    expect(changeMeSchema.safeParse({ zone }).success).toBe(ok),
  );
});
