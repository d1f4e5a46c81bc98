import { lazy, type ReactNode, Suspense } from 'react';
import type { DialogProps } from './modal-dialog';

/** What draws a dialog comes when the first one is opened: no page needs it to be shown. */
const ModalDialog = lazy(async () => ({ default: (await import('./modal-dialog')).ModalDialog }));

export function Dialog(props: DialogProps): ReactNode {
  return (
    <Suspense fallback={null}>
      <ModalDialog {...props} />
    </Suspense>
  );
}
