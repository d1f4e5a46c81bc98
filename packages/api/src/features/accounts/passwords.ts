import { Injectable, type OnModuleInit } from '@nestjs/common';
import { hash, verify } from '@node-rs/argon2';
import { dictionary } from '@zxcvbn-ts/language-common';
import { BadInput } from '../../common/errors/app-error.js';

/** argon2id with 19 MiB, two passes, one lane: the first choice of the OWASP password storage sheet. */
const OWASP = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;
const COMMON = new Set<string>(dictionary['passwords-common'] as string[]);

@Injectable()
export class Passwords implements OnModuleInit {
  private nobodys = '';

  async onModuleInit(): Promise<void> {
    this.nobodys = await this.hash('nobody has this password');
  }

  hash(password: string): Promise<string> {
    return hash(password, OWASP);
  }

  /** Takes the same time where there is no account. */
  async matches(password: string, passwordHash: string | null): Promise<boolean> {
    const matched = await verify(passwordHash ?? this.nobodys, password).catch(() => false);
    return matched && passwordHash !== null;
  }

  /** Refuses what is on every list of guesses, or says the address or the name. */
  refuseCommon(password: string, path: string, about: readonly string[]): void {
    const lower = password.toLowerCase();
    const told = about.some(
      (one) => one.length >= 4 && lower.includes(one.toLowerCase()) && password.length < one.length + 6,
    );
    if (told || COMMON.has(lower) || /^(.)\1+$/.test(password))
      throw new BadInput([
        { path, message: 'This password is among the first that are guessed: choose another.' },
      ]);
  }
}
