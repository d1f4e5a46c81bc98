import { Injectable } from '@nestjs/common';
import type { Actor, ChangeMe, Me } from '@rivetside/shared';
import { ActorReader } from '../../common/access/actor-reader.js';
import { Reader } from '../../common/database/reader.js';
import { UnitOfWork } from '../../common/database/unit-of-work.js';
import { NotFound } from '../../common/errors/app-error.js';
import { UserEntity } from './user.entity.js';

/** One's own account, as far as it opens nothing. */
@Injectable()
export class MeService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly reader: Reader,
    private readonly actors: ActorReader,
  ) {}

  async read(userId: string): Promise<Me> {
    const user = await this.reader.manager.findOneBy(UserEntity, { id: userId });
    if (!user) throw new NotFound('account');
    const { id, name, email, units, zone, siteRole } = user;
    return { id, name, email, units, zone, memberships: this.actors.membershipsOf(id), siteRole };
  }

  async change(actor: Actor, input: ChangeMe): Promise<Me> {
    if (Object.keys(input).length > 0)
      await this.unitOfWork.run((tx) => tx.manager.update(UserEntity, { id: actor.id }, input));
    return this.read(actor.id);
  }
}
