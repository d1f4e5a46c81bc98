import '@mantine/core/styles/UnstyledButton.css';
import '@mantine/core/styles/CloseButton.css';
import '@mantine/core/styles/Paper.css';
import '@mantine/core/styles/Overlay.css';
import '@mantine/core/styles/ModalBase.css';
import '@mantine/core/styles/Modal.css';
import { Modal } from '@mantine/core';
import type { Me } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { useNavigate } from 'react-router-dom';
import { SignInForm } from '../../features/accounts/sign-in-form';
import { session } from '../../lib/session';
import classes from './lost-session.module.css';

/** Over the page and not in its place: what was typed below stays, and what was being sent goes on. */
export function LostSession({ me }: { readonly me: Me }): ReactNode {
  const navigate = useNavigate();
  const leave = () => session.leave(() => navigate('/sign-in'));
  return (
    <Modal
      opened
      onClose={() => undefined}
      withCloseButton={false}
      closeOnEscape={false}
      closeOnClickOutside={false}
      centered
      title="Your session has ended"
      className={classes['dialog'] ?? ''}
    >
      <p>Sign in again and go on: nothing on this page is lost.</p>
      <SignInForm email={me.email} onSignedIn={() => undefined} />
      <p>
        <button type="button" className="btn plain" onClick={() => void leave()}>
          Leave this page and sign in as somebody else
        </button>
      </p>
    </Modal>
  );
}
