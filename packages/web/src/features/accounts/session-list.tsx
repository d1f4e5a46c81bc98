import type { Session } from '@rivetside/shared';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useNavigate } from 'react-router-dom';
import { api } from '../../lib/api';
import { sentenceOf } from '../../lib/problem';
import { session } from '../../lib/session';
import { useTimes } from '../../lib/times';
import { Refusal } from './form-parts';
import { ownSessions } from './queries';
import classes from './accounts.module.css';

/** The devices that are signed in; ending the one in use is the same as signing out. */
export function SessionList(): ReactNode {
  const { data, error } = useQuery(ownSessions);
  const end = useEndSession();
  const devices = data?.items ?? [];
  if (error) return <div>{<Refusal>{sentenceOf(error)}</Refusal>}</div>;
  return (
    <>
      {end.error && (
        <div>
          <Refusal>{sentenceOf(end.error)}</Refusal>
        </div>
      )}
      <ul className={classes['sessions']} aria-busy={!data}>
        {devices.map((one) => (
          <Device key={one.id} device={one} onEnd={() => end.mutate(one)} />
        ))}
      </ul>
      {devices.length > 1 && (
        <div>
          <button type="button" className="btn plain" onClick={() => end.mutate('others')}>
            Sign out everywhere else
          </button>
        </div>
      )}
    </>
  );
}

function Device({ device, onEnd }: { readonly device: Session; readonly onEnd: () => void }): ReactNode {
  const { dateTime } = useTimes();
  return (
    <li>
      <span>
        <b>{device.device}</b>
        <small>
          {device.current ? 'this one, ' : ''}signed in {dateTime(device.createdAt)}, last used{' '}
          {dateTime(device.lastUsedAt)}
        </small>
      </span>
      <button type="button" className="btn plain" aria-label={`Sign out of ${device.device}`} onClick={onEnd}>
        Sign out
      </button>
    </li>
  );
}

function useEndSession() {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  return useMutation({
    mutationFn: async (which: Session | 'others') => {
      if (which === 'others') await api.delete('/me/sessions');
      else if (which.current) await session.signOut(() => navigate('/'));
      else await api.delete(`/me/sessions/${which.id}`);
    },
    onSuccess: () =>
      session.me() ? queryClient.invalidateQueries({ queryKey: ownSessions.queryKey }) : undefined,
  });
}
