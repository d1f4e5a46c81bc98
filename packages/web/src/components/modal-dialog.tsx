import '@mantine/core/styles/UnstyledButton.css';
import '@mantine/core/styles/CloseButton.css';
import '@mantine/core/styles/Paper.css';
import '@mantine/core/styles/Overlay.css';
import '@mantine/core/styles/ModalBase.css';
import '@mantine/core/styles/Modal.css';
import { Modal } from '@mantine/core';
import { type ReactNode, useEffect, useState } from 'react';
import classes from './dialog.module.css';

export interface DialogProps {
  readonly title: string;
  readonly onClose: () => void;
  readonly wide?: boolean;
  readonly children: ReactNode;
}

/** Over the page, with the focus kept inside; Escape closes it and what was typed stays in its draft. */
export function ModalDialog({ title, onClose, wide = false, children }: DialogProps): ReactNode {
  useFocusBack();
  return (
    <Modal.Root
      opened
      onClose={onClose}
      size={wide ? 920 : 560}
      yOffset="4vh"
      returnFocus={false}
      transitionProps={{ duration: 0 }}
      className={classes['dialog'] ?? ''}
    >
      <Modal.Overlay />
      <Modal.Content>
        {/* Mantine's own header would be a second banner of the page to whoever listens to it. */}
        <div className={classes['head']}>
          <Modal.Title>{title}</Modal.Title>
          <Modal.CloseButton size={44} aria-label="Close; what was typed is kept" />
        </div>
        <Modal.Body>{children}</Modal.Body>
      </Modal.Content>
    </Modal.Root>
  );
}

/** A dialog that is taken away as a whole gives no focus back by itself: it would fall to the top of the page. */
function useFocusBack(): void {
  const [opener] = useState(() => document.activeElement);
  useEffect(
    () => () => {
      if (opener instanceof HTMLElement && opener.isConnected) opener.focus();
    },
    [opener],
  );
}
