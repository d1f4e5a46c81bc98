import { useCallback, type ReactNode } from 'react';
import { useOnline } from '../../lib/online';
import { randomKey } from '../../lib/random-key';
import type { DraftPhoto } from './draft-photo';
import { PhotoAdder } from './photo-adder';
import { photoWire, reasonOfPhoto } from './photo-wire';
import { usePhotoSending } from './use-photo-sending';

interface DraftPhotosProps {
  readonly photos: readonly DraftPhoto[];
  /** Has to stay the same function: what is on its way ends with it. */
  readonly onChange: (update: (photos: readonly DraftPhoto[]) => readonly DraftPhoto[]) => void;
  readonly error?: string | undefined;
}

/** The photos of a draft, sent while the rest is being written. */
export function DraftPhotos({ photos, onChange, error }: DraftPhotosProps): ReactNode {
  const isOnline = useOnline();
  const handleSent = useCallback(
    ({ key, sent }: DraftPhoto) =>
      onChange((old) => old.map((one) => (one.key === key ? { ...one, sent } : one))),
    [onChange],
  );
  const sending = usePhotoSending({
    photos,
    onSent: handleSent,
    isOnline,
    wire: photoWire,
    reasonOf: reasonOfPhoto,
  });
  return (
    <PhotoAdder
      photos={photos}
      onChange={onChange}
      sending={sending}
      isOnline={isOnline}
      newKey={randomKey}
      error={error}
    />
  );
}
