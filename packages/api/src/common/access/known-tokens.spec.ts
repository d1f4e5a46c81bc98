import { JwtService } from '@nestjs/jwt';
import { KnownTokens } from './known-tokens.js';

const jwt = new JwtService({ secret: 'for this test only' });
const sign = (seconds: number, payload: object = { sub: 'user', sid: 'session', typ: 'access' }) =>
  `Bearer ${jwt.sign(payload, { expiresIn: seconds })}`;

describe('KnownTokens', () => {
  it('knows nothing that was not remembered', () => {
    const tokens = new KnownTokens(jwt);
    expect(tokens.claims(sign(60))).toBeNull();
    expect(tokens.claims(undefined)).toBeNull();
    expect(tokens.claims('Basic abc')).toBeNull();
  });

  it('knows a remembered token by its whole text', () => {
    const tokens = new KnownTokens(jwt);
    const header = sign(60);
    tokens.remember(header);
    expect(tokens.claims(header)).toEqual({ sub: 'user', sid: 'session' });
    expect(tokens.claims(`${header}x`)).toBeNull();
    expect(tokens.claims(header.slice(0, -1))).toBeNull();
  });

  it('forgets a token that has ended', () => {
    const tokens = new KnownTokens(jwt);
    const header = sign(-1);
    tokens.remember(header);
    expect(tokens.claims(header)).toBeNull();
  });

  it('remembers no token of another kind', () => {
    const tokens = new KnownTokens(jwt);
    const header = sign(60, { sub: 'user', sid: 'session', typ: 'refresh' });
    tokens.remember(header);
    expect(tokens.claims(header)).toBeNull();
  });
});
