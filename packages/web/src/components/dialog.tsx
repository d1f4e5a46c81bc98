import '@mantine/core/styles/UnstyledButton.css';
import '@mantine/core/styles/CloseButton.css';
import '@mantine/core/styles/Paper.css';
import '@mantine/core/styles/Overlay.css';
import '@mantine/core/styles/ModalBase.css';
import '@mantine/core/styles/Modal.css';
import { Modal } from '@mantine/core';
import type { ReactNode } from 'react';
import classes from './dialog.module.css';

interface DialogProps {
  readonly title: string;
  readonly onClose: () => void;
  readonly wide?: boolean;
  readonly children: ReactNode;
}

/** Over the page, with the focus kept inside; Escape closes it and what was typed stays in its draft. */
export function Dialog({ title, onClose, wide = false, children }: DialogProps): ReactNode {
  return (
    <Modal
      opened
      onClose={onClose}
      title={title}
      size={wide ? 920 : 560}
      yOffset="4vh"
      closeButtonProps={{ 'aria-label': 'Close; what was typed is kept', size: 44 }}
      transitionProps={{ duration: 0 }}
      className={classes['dialog'] ?? ''}
    >
      {children}
    </Modal>
  );
}
