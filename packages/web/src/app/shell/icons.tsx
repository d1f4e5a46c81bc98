import type { ReactNode } from 'react';

const LINES = {
  bench: 'M3 9h18M5 9v10M19 9v10M5 14h14M8 9V5h5v4',
  kit: 'M12 3v18M3 11l9-3 9 3M8 20l4-2 4 2',
  questions:
    'M5.5 3h13A1.5 1.5 0 0 1 20 4.5v15a1.5 1.5 0 0 1-1.5 1.5h-13A1.5 1.5 0 0 1 4 19.5v-15A1.5 1.5 0 0 1 5.5 3zM8 11a4 4 0 1 0 8 0a4 4 0 1 0-8 0M12 5v3M12 14v3M6 11h3M15 11h3',
  record: 'M5 3h11l3 3v15H5zM8 9h8M8 13h8M8 17h5',
  more: 'M4 12a1.5 1.5 0 1 0 3 0a1.5 1.5 0 1 0-3 0M10.5 12a1.5 1.5 0 1 0 3 0a1.5 1.5 0 1 0-3 0M17 12a1.5 1.5 0 1 0 3 0a1.5 1.5 0 1 0-3 0',
} as const;
export type IconName = keyof typeof LINES;

/** Beside its word always, so it says nothing by itself. */
export function Icon({ name }: { readonly name: IconName }): ReactNode {
  return (
    <svg
      viewBox="0 0 24 24"
      width="22"
      height="22"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.6"
      aria-hidden
    >
      <path d={LINES[name]} />
    </svg>
  );
}

/** Two sheets, lapped, with two rivets through both. */
export function Mark({ size = 44 }: { readonly size?: number }): ReactNode {
  return (
    <svg viewBox="0 0 44 44" width={size} height={size} aria-hidden>
      <rect x="3" y="9" width="26" height="26" rx="4" fill="none" stroke="#C9D3D9" strokeWidth="2.4" />
      <rect
        x="15"
        y="9"
        width="26"
        height="26"
        rx="4"
        fill="#A9BC5A"
        fillOpacity=".22"
        stroke="#A9BC5A"
        strokeWidth="2.4"
      />
      <circle cx="22" cy="16" r="2.6" fill="#F3F5E6" />
      <circle cx="22" cy="28" r="2.6" fill="#F3F5E6" />
    </svg>
  );
}
