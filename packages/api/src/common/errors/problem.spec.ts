import { ServiceUnavailableException } from '@nestjs/common';
import {
  AppError,
  BadInput,
  Conflict,
  NotAllowed,
  NotFound,
  NotReady,
  NotSignedIn,
  ReadsOnly,
  TooLarge,
  TooMany,
  WrongMethod,
  WrongType,
} from './app-error.js';
import { problemOf } from './problem.js';

class HoleTaken extends Conflict {}
class Strange extends AppError {
  readonly title = 'Strange';
}
const coded = (code: string, message = 'SELECT secret FROM users at /srv/data/x.sqlite') =>
  Object.assign(new Error(message), { code });

describe('problemOf', () => {
  it.each([
    { error: new NotFound('kit'), status: 404 },
    { error: new NotSignedIn(), status: 401 },
    { error: new NotAllowed('Mentors only.'), status: 403 },
    { error: new BadInput([{ path: 'a', message: 'b' }]), status: 400 },
    { error: new Conflict('Taken.'), status: 409 },
    { error: new HoleTaken('Taken.'), status: 409 },
    { error: new TooLarge('Over 12 MB.'), status: 413 },
    { error: new WrongType('No SVG.'), status: 415 },
    { error: new WrongMethod(['GET']), status: 405 },
    { error: new TooMany(7), status: 429 },
    { error: new ReadsOnly(), status: 503 },
    { error: new NotReady({ disk: 'full' }), status: 503 },
    { error: new Strange('Unheard of.'), status: 500 },
    { error: new ServiceUnavailableException('inner words'), status: 503 },
    { error: coded('SQLITE_FULL'), status: 507 },
    { error: coded('ENOSPC'), status: 507 },
    { error: coded('SQLITE_BUSY_SNAPSHOT'), status: 503 },
    { error: coded('SQLITE_CONSTRAINT_UNIQUE'), status: 409 },
    { error: coded('SQLITE_CONSTRAINT_FOREIGNKEY'), status: 409 },
    { error: coded('SQLITE_CONSTRAINT_NOTNULL'), status: 500 },
    { error: coded('SQLITE_ERROR'), status: 500 },
    { error: Object.assign(new Error('inner words'), { statusCode: 413 }), status: 413 },
    { error: Object.assign(new Error('inner words'), { statusCode: 200 }), status: 500 },
    { error: new TypeError('inner words'), status: 500 },
    { error: 'text', status: 500 },
    { error: null, status: 500 },
  ])('makes $status of $error.message', ({ error, status }) => {
    const problem = problemOf(error, '/api/x');
    expect(problem).toMatchObject({ type: 'about:blank', status, instance: '/api/x' });
    expect(problem.detail).toMatch(/\w/);
  });

  it.each([
    { error: coded('SQLITE_ERROR') },
    { error: coded('SQLITE_FULL') },
    { error: new Error('at Foo (/srv/app/x.js:1:2)') },
    { error: { message: 'SELECT', stack: 'at /srv/x.js' } },
  ])('lets no word of a library out: $error.message', ({ error }) =>
    expect(JSON.stringify(problemOf(error, '/api/x'))).not.toMatch(/SELECT|srv|SQLITE|\.js/),
  );

  it('names each fault of a bad input', () => {
    const faults = [{ path: 'layers.0.thickness', message: 'More than nothing.' }];
    expect(problemOf(new BadInput(faults), '/').errors).toEqual(faults);
  });

  it('says with a conflict how things stand, without letting that overrule the problem itself', () => {
    const problem = problemOf(new Conflict('Closed.', { state: 'closed', status: 200, detail: 'x' }), '/');
    expect(problem).toMatchObject({ status: 409, detail: 'Closed.', current: { state: 'closed' } });
  });

  it('says what is not ready', () => {
    expect(problemOf(new NotReady({ disk: 'it is full' }), '/')).toMatchObject({
      detail: 'disk: it is full',
      checks: { disk: 'it is full' },
    });
  });
});
