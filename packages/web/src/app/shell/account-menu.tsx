import { useMantineColorScheme } from '@mantine/core';
import type { ReactNode } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { session, useMe } from '../../lib/session';
import { FindField } from './find-field';
import { PopUp } from './pop-up';
import { UnitsSwitch } from './units-switch';
import classes from './account-menu.module.css';

/** "Ottoline Brackwater" signs with OB. */
export function initialsOf(name: string): string {
  const words = name.split(/\s+/).filter(Boolean);
  return [words[0], words.length > 1 ? words.at(-1) : undefined]
    .map((word) => word?.[0] ?? '')
    .join('')
    .toUpperCase();
}

function Lines({ close }: { readonly close: () => void }): ReactNode {
  const me = useMe();
  const navigate = useNavigate();
  const { colorScheme, setColorScheme } = useMantineColorScheme();
  const signOut = async () => {
    close();
    await session.signOut(() => navigate('/'));
  };
  return (
    <>
      <p className={classes['who']}>
        <b>{me?.name}</b>
        <span>{me?.email}</span>
      </p>
      <div className={classes['phoneOnly']}>
        <FindField onFind={close} />
        <UnitsSwitch />
      </div>
      <Link to="/account" onClick={close}>
        Your account
      </Link>
      <Link to="/stop" onClick={close}>
        Something is wrong
      </Link>
      <fieldset className={classes['scheme']}>
        <legend>Light or dark</legend>
        {(['auto', 'light', 'dark'] as const).map((one) => (
          <button
            key={one}
            type="button"
            aria-pressed={colorScheme === one}
            onClick={() => setColorScheme(one)}
          >
            {one === 'auto' ? 'as the device' : one}
          </button>
        ))}
      </fieldset>
      <button type="button" onClick={() => void signOut()}>
        Sign out
      </button>
    </>
  );
}

/** Initials at a desk, the last place of the bar on a phone. */
export function AccountMenu({ shownAs }: { readonly shownAs: 'initials' | 'place' }): ReactNode {
  const me = useMe();
  if (!me) return null;
  return (
    <PopUp
      shownAs={shownAs}
      label={shownAs === 'initials' ? `${me.name}: your account` : 'More'}
      initials={initialsOf(me.name)}
    >
      {(close) => <Lines close={close} />}
    </PopUp>
  );
}
