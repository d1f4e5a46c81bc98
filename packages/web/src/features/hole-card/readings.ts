import { formatLength, type Measured, type Units } from '@rivetside/shared';
import type { TypedLength } from './hole-card-fields';
import { asMeasured, readTyped, type TypedReading } from './typed-length';

/** Parts of the card that one field stands for, longest first. */
const MERGED: readonly (readonly [RegExp, string])[] = [
  [/\.(value|u)$/, ''],
  [/\.hole\.(diameter|length)$/, '.largest'],
  [/\.hole\.width$/, '.smallest'],
  [/\.hole\.angle$/, '.holeAngle'],
  [/\.hole(\.shape)?$/, '.largest'],
  [/\.offset\.[xy]$/, '.offset'],
  [/^(neighbours\.\d+)\.(x|y|head)$/, '$1'],
  [/^rivet\..*$/, 'rivet'],
];

/** Collects, while a form is read, what each field has to be told, and which field each part of the card came from. */
export class Readings {
  readonly errors: Record<string, string> = {};
  readonly notes: Record<string, string> = {};
  /** Lists of the card leave out blank rows: for each, the rows of the form that are left. */
  private readonly kept = new Map<string, readonly number[]>();

  constructor(private readonly units: Units) {}

  /** The first fault of a field is told; those that follow from it are not. */
  refuse(key: string, message: string): void {
    this.errors[key] ??= message;
  }

  /** A length as it is said in a note, in the reader's units. */
  said(inches: number): string {
    return formatLength(inches, this.units);
  }

  note(key: string, text: string): void {
    this.notes[key] = text;
  }

  read(key: string, field: TypedLength): TypedReading {
    const reading = readTyped(field);
    if (reading.kind === 'unread') this.refuse(key, reading.message);
    return reading;
  }

  /** A length as it goes on the card; null where it is blank or not understood. */
  length(key: string, field: TypedLength): Measured | null {
    const reading = this.read(key, field);
    return reading.kind === 'read' ? asMeasured(reading.inches, reading.u) : null;
  }

  renumber(list: string, rows: readonly number[]): void {
    this.kept.set(list, rows);
  }

  fieldOf(path: string): string {
    const rowed = [...this.kept].reduce((text, [list, rows]) => {
      if (!text.startsWith(`${list}.`)) return text;
      const [index, ...rest] = text.slice(list.length + 1).split('.');
      const row = rows[Number(index)] ?? index;
      return [list, row, ...rest].join('.');
    }, path);
    return MERGED.reduce((text, [part, field]) => text.replace(part, field), rowed);
  }
}
