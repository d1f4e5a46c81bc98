import { Injectable, type OnModuleInit } from '@nestjs/common';
import { hash, verify } from '@node-rs/argon2';
import { BadInput } from '../../common/errors/app-error.js';
import { isGuessable } from './password-guesses.js';

/** argon2id with 19 MiB, two passes, one lane: the first choice of the OWASP password storage sheet. */
const OWASP = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

@Injectable()
export class Passwords implements OnModuleInit {
  private nobodys = '';

  async onModuleInit(): Promise<void> {
    this.nobodys = await this.hash('nobody has this password');
  }

  /** Takes a few tens of milliseconds and 19 MiB: never inside a unit of work. */
  hash(password: string): Promise<string> {
    return hash(password, OWASP);
  }

  /** Takes the same time where there is no account. */
  async matches(password: string, passwordHash: string | null): Promise<boolean> {
    const matched = await verify(passwordHash ?? this.nobodys, password).catch(() => false);
    return matched && passwordHash !== null;
  }

  /** Refuses what is on every list of guesses, or says no more than the address or the name. */
  refuseCommon(password: string, path: string, about: readonly string[]): void {
    if (isGuessable(password, about))
      throw new BadInput([
        { path, message: 'This password is among the first that are guessed: choose another.' },
      ]);
  }
}
