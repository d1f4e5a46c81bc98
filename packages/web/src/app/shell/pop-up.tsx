import {
  type FocusEvent,
  type KeyboardEvent,
  type ReactNode,
  useEffect,
  useId,
  useRef,
  useState,
} from 'react';
import { useLocation } from 'react-router-dom';
import { Icon } from './icons';
import classes from './account-menu.module.css';
import rail from './rail.module.css';

interface PopUpProps {
  readonly shownAs: 'initials' | 'place';
  readonly label: string;
  readonly initials: string;
  readonly children: (close: () => void) => ReactNode;
}

/** A button and what it opens. Closed by Escape, by pressing beside it, by leaving it with Tab, by going elsewhere. */
export function PopUp({ shownAs, label, initials, children }: PopUpProps): ReactNode {
  const [isOpen, setOpen] = useState(false);
  const id = useId();
  const whole = useRef<HTMLDivElement>(null);
  const button = useRef<HTMLButtonElement>(null);
  const { pathname, search } = useLocation();
  const close = () => setOpen(false);
  useEffect(close, [pathname, search]);
  useEffect(() => {
    if (!isOpen) return;
    const handlePress = ({ target }: PointerEvent) => {
      if (!whole.current?.contains(target as Node)) close();
    };
    document.addEventListener('pointerdown', handlePress);
    return () => document.removeEventListener('pointerdown', handlePress);
  }, [isOpen]);

  const handleKey = (event: KeyboardEvent) => {
    if (event.key !== 'Escape' || !isOpen) return;
    close();
    button.current?.focus();
  };
  const handleBlur = ({ relatedTarget }: FocusEvent) => {
    if (relatedTarget instanceof Node && !whole.current?.contains(relatedTarget)) close();
  };
  return (
    <div ref={whole} className={classes['popUp']} onKeyDown={handleKey} onBlur={handleBlur}>
      <button
        ref={button}
        type="button"
        aria-label={label}
        aria-expanded={isOpen}
        aria-controls={id}
        className={shownAs === 'initials' ? classes['initials'] : rail['place']}
        onClick={() => setOpen(!isOpen)}
      >
        {shownAs === 'initials' ? (
          <span>{initials}</span>
        ) : (
          <>
            <Icon name="more" />
            {label}
          </>
        )}
      </button>
      <div id={id} hidden={!isOpen} className={classes['lines']} data-shown-as={shownAs}>
        {isOpen && children(close)}
      </div>
    </div>
  );
}
