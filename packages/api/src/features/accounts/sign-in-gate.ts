import { Injectable } from '@nestjs/common';
import { NotSignedIn } from '../../common/errors/app-error.js';
import { OneAtATime } from '../../common/limits/one-at-a-time.js';
import { Tries, type TryLimit } from '../../common/limits/tries.js';
import { WRONG_BY_DEVICE, WRONG_BY_STRANGER, WRONG_FOR_ACCOUNT, WRONG_FROM_ADDRESS } from './limits.js';

export interface Caller {
  readonly email: string;
  /** Where it comes from. */
  readonly network: string;
  /** The browser, where it has signed in to this account before. */
  readonly device: string | null;
}

type Count = readonly [limit: TryLimit, who: string];

/** Holds off whoever guesses passwords, before a password is looked at. */
@Injectable()
export class SignInGate {
  private readonly turns = new OneAtATime();

  constructor(private readonly tries: Tries) {}

  admit<T>(caller: Caller, attempt: () => Promise<T>): Promise<T> {
    const counts = countsOf(caller);
    // Tries in parallel cannot slip past the limit, nor do right passwords in parallel run into it.
    return this.turns.run(counts[0]![1], async () => {
      for (const [limit, who] of counts) this.tries.refuseIfSpent(limit, who);
      try {
        const result = await attempt();
        for (const [limit, who] of counts) if (limit !== WRONG_FROM_ADDRESS) this.tries.forgive(limit, who);
        return result;
      } catch (error) {
        if (error instanceof NotSignedIn) for (const [limit, who] of counts) this.tries.count(limit, who);
        throw error;
      }
    });
  }
}

function countsOf({ email, network, device }: Caller): readonly Count[] {
  if (device !== null) return [[WRONG_BY_DEVICE, device]];
  return [
    [WRONG_BY_STRANGER, `${email}\n${network}`],
    [WRONG_FOR_ACCOUNT, email],
    [WRONG_FROM_ADDRESS, network],
  ];
}
