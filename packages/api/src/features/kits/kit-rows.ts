import type {
  HoleLine,
  KitLimits,
  MetHere,
  Notice,
  NoticeClass,
  Part,
  SectionSummary,
  Step,
} from '@rivetside/shared';

export interface SectionRow {
  id: string;
  kitId: string;
  code: string;
  name: string;
  position: number;
  critical: number;
  regions: string;
  stepCount: number;
  kitName: string;
  steward: string | null;
}
export interface HoleLineRow {
  id: string;
  sectionId: string;
  stepId: string | null;
  code: string;
  title: string;
  stack: string;
  head: 'universal' | 'flush';
  alloy: string;
  dash: number;
  lengthDash: number | null;
  callOut: string;
  drill: string;
  holeDiameter: number;
  pitch: number | null;
  edge: number | null;
  count: number;
  repeats: number;
  drive: string | null;
  revision: string;
  limits: string | null;
  questionCount: number;
}
export interface NoticeRow extends Omit<Notice, 'sectionCodes' | 'partNumbers' | 'holeLineCodes'> {
  sectionCodes: string;
  partNumbers: string;
  holeLineCodes: string;
}
export type StepRow = Omit<Step, 'twoPerson' | 'closesStructure'> & {
  twoPerson: number;
  closesStructure: number;
};
export type MetHereRow = Omit<MetHere, 'place'> & { holeLineCode: string | null; partNumber: string | null };

const list = (text: string) => JSON.parse(text) as string[];

export function presentSection(
  row: SectionRow,
  questions: SectionSummary['questions'],
  progress: SectionSummary['progress'],
): SectionSummary {
  const { id, kitId, code, name, position, stepCount } = row;
  return {
    id,
    kitId,
    code,
    name,
    position,
    critical: row.critical === 1,
    regions: list(row.regions),
    stepCount,
    questions,
    progress,
  };
}

export function presentStep(row: StepRow): Step {
  return { ...row, twoPerson: row.twoPerson === 1, closesStructure: row.closesStructure === 1 };
}

export function presentPart(row: Part): Part {
  const { id, sectionId, number, name, alloy, thickness, quantity, hands, questionCount } = row;
  return { id, sectionId, number, name, alloy, thickness, quantity, hands, questionCount };
}

export function presentHoleLine(row: HoleLineRow, stack: HoleLine['stack']): HoleLine {
  const { id, sectionId, stepId, code, title, head, alloy, dash, lengthDash, callOut, drill, holeDiameter } =
    row;
  const { pitch, edge, count, repeats, drive, revision, questionCount } = row;
  const rivet = { head, alloy, dash, lengthDash };
  const limits = row.limits === null ? null : (JSON.parse(row.limits) as KitLimits);
  return {
    id,
    sectionId,
    stepId,
    code,
    title,
    stack,
    rivet,
    callOut,
    drill,
    holeDiameter,
    pitch,
    edge,
    count,
    repeats,
    drive,
    revision,
    limits,
    questionCount,
  };
}

export function presentNotice(row: NoticeRow): Notice {
  const { id, kitId, number, title, revision, issuedOn, serialFrom, serialTo, holes, text } = row;
  const lists = {
    sectionCodes: list(row.sectionCodes),
    partNumbers: list(row.partNumbers),
    holeLineCodes: list(row.holeLineCodes),
  };
  return {
    id,
    kitId,
    number,
    title,
    class: row.class as NoticeClass,
    revision,
    issuedOn,
    serialFrom,
    serialTo,
    ...lists,
    holes,
    text,
  };
}

export function presentMetHere({ holeLineCode, partNumber, ...row }: MetHereRow): MetHere {
  return { ...row, place: [holeLineCode, partNumber].filter(Boolean).join(' · ') };
}
