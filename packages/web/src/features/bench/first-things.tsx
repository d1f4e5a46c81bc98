import type { Membership } from '@rivetside/shared';
import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { EmptyPage } from '../../components/pages/empty-page';
import { chapterList } from './queries';
import classes from './bench.module.css';

/** Before anybody took one in: where the chapters meet, and what can be read already. */
export function NoChapterYet({ memberships }: { readonly memberships: readonly Membership[] }): ReactNode {
  const { data } = useQuery(chapterList);
  const asked = memberships.filter(({ status }) => status === 'requested');
  const held = memberships.filter(({ status }) => status === 'suspended');
  return (
    <EmptyPage title="Your bench begins with a chapter.">
      {asked.map(({ chapterId, chapterName }) => (
        <p key={chapterId}>{chapterName} has your request. Its chapter admin answers it.</p>
      ))}
      {held.map(({ chapterId, chapterName }) => (
        <p key={chapterId}>
          Your membership in {chapterName} is suspended. Its chapter admin can tell you why.
        </p>
      ))}
      {asked.length + held.length === 0 && (
        <p>
          Questions are asked and answered in a chapter. Go to where one meets; its chapter admin takes you
          in.
        </p>
      )}
      {data && data.items.length > 0 && (
        <dl className={classes['chapters']}>
          {data.items.map(({ id, name, meets, place }) => (
            <div key={id}>
              <dt>{name}</dt>
              <dd>
                {place}, {meets}
              </dd>
            </div>
          ))}
        </dl>
      )}
      <p className={classes['buttons']}>
        <Link className="btn" to="/stop">
          Something is wrong
        </Link>
        <Link className="btn plain" to="/kit">
          Look at the kit
        </Link>
      </p>
    </EmptyPage>
  );
}

/** A builder without an aircraft of their own may ask all the same. */
export function NoBuildYet(): ReactNode {
  return (
    <EmptyPage title="No build stands in your name yet.">
      <p>
        You can ask about any place on the kit all the same. Your steps, open items and record show here once
        a build with its serial is yours, or you help on one.
      </p>
      <p className={classes['buttons']}>
        <Link className="btn" to="/kit">
          Find the place on the kit
        </Link>
        <Link className="btn plain" to="/stop">
          Something is wrong
        </Link>
      </p>
    </EmptyPage>
  );
}
