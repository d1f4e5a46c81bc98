import { Injectable } from '@nestjs/common';
import { type ChapterRole, type DemoSignIn, rolesOf, type SiteRole } from '@rivetside/shared';
import { ActorReader } from '../../common/access/actor-reader.js';
import { Settings } from '../../common/config/settings.js';
import { PreparedReader } from '../../common/database/prepared-reader.js';

export const DEMO_PASSWORD = 'rivetside-demo';

const PEOPLE = ['builder', 'builder2', 'mentor', 'mentor2', 'mentor3', 'admin', 'admin2', 'steward', 'site'];
const ONE = 'SELECT "id", "name", "siteRole" FROM "users" WHERE "email" = ?';
const ROLE_WORDS: Readonly<Record<ChapterRole | NonNullable<SiteRole> | 'guest', string>> = {
  guest: 'no chapter yet',
  builder: 'builder',
  mentor: 'mentor',
  chapterAdmin: 'chapter admin',
  steward: 'kit steward',
  siteAdmin: 'site admin',
};

/** Who a visitor of the demo may be, as the loaded world has them. */
@Injectable()
export class DemoService {
  constructor(
    private readonly reader: PreparedReader,
    private readonly actors: ActorReader,
    private readonly settings: Settings,
  ) {}

  /** Nobody where there is no demo: on a real site such an account would be no demo's. */
  signIns(): DemoSignIn[] {
    if (!this.settings.demo) return [];
    return PEOPLE.flatMap((person) => this.signIn(`${person}@demo.rivetside.example`) ?? []);
  }

  private signIn(email: string): DemoSignIn | null {
    const user = this.reader.get<{ id: string; name: string; siteRole: SiteRole }>(ONE, [email]);
    if (!user) return null;
    const memberships = this.actors.membershipsOf(user.id);
    const roles = rolesOf({ memberships, siteRole: user.siteRole }).map((role) => ROLE_WORDS[role]);
    const chapters = memberships.map(({ chapterName }) => chapterName);
    return { email, name: user.name, as: [roles.join(' and '), ...chapters].join(', ') };
  }
}
