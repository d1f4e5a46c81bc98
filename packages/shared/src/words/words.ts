import { z } from 'zod';

/** Fields of work in which a mentor may have standing. */
export const DISCIPLINES = [
  'sheetMetal',
  'riveting',
  'sealant',
  'corrosion',
  'controls',
  'electrical',
  'engine',
  'composites',
  'paperwork',
] as const;
export const disciplineSchema = z.enum(DISCIPLINES);
export type Discipline = z.infer<typeof disciplineSchema>;

/** The discipline as it stands on a stamp and in lists. */
export const DISCIPLINE_WORDS: Readonly<Record<Discipline, string>> = {
  sheetMetal: 'sheet metal',
  riveting: 'riveting',
  sealant: 'sealant and tank',
  corrosion: 'corrosion and paint',
  controls: 'controls',
  electrical: 'electrical',
  engine: 'engine and firewall forward',
  composites: 'composites and canopy',
  paperwork: 'paperwork and inspection',
};

/** What can be wrong. */
export const MISHAPS = [
  'misalignedHole',
  'outOfRoundHole',
  'doubleHole',
  'edgeTooNear',
  'badRivet',
  'dimpleOrCountersink',
  'nutplate',
  'fit',
  'bentOrCracked',
  'surface',
  'sealantOrLeak',
  'process',
  'substitution',
  'wrongPart',
  'paperwork',
  'other',
] as const;
export const mishapSchema = z.enum(MISHAPS);
export type Mishap = z.infer<typeof mishapSchema>;

export const MISHAP_WORDS: Readonly<Record<Mishap, string>> = {
  misalignedHole: 'Holes do not line up',
  outOfRoundHole: 'Hole out of round',
  doubleHole: 'Two holes in one place',
  edgeTooNear: 'Too near an edge',
  badRivet: 'Rivet set badly',
  dimpleOrCountersink: 'Dimple or countersink',
  nutplate: 'Nutplate thread',
  fit: 'Gap or fit',
  bentOrCracked: 'Bent or cracked',
  surface: 'Surface',
  sealantOrLeak: 'Sealant or leak',
  process: 'Order or process',
  substitution: 'Other fastener or material',
  wrongPart: 'Wrong part or step',
  paperwork: 'Paperwork',
  other: 'Something else',
};

/** Mishaps that are about a hole, for which the hole card is filled in. */
export const HOLE_MISHAPS: readonly Mishap[] = [
  'misalignedHole',
  'outOfRoundHole',
  'doubleHole',
  'edgeTooNear',
  'badRivet',
  'dimpleOrCountersink',
  'nutplate',
];

/** The discipline that a mishap usually belongs to; the asker may choose another. */
export const USUAL_DISCIPLINE: Readonly<Record<Mishap, Discipline>> = {
  misalignedHole: 'sheetMetal',
  outOfRoundHole: 'sheetMetal',
  doubleHole: 'sheetMetal',
  edgeTooNear: 'sheetMetal',
  badRivet: 'riveting',
  dimpleOrCountersink: 'riveting',
  nutplate: 'riveting',
  fit: 'sheetMetal',
  bentOrCracked: 'sheetMetal',
  surface: 'corrosion',
  sealantOrLeak: 'sealant',
  process: 'sheetMetal',
  substitution: 'riveting',
  wrongPart: 'sheetMetal',
  paperwork: 'paperwork',
  other: 'sheetMetal',
};

export const FIX_KINDS = [
  'leave',
  'cleanUp',
  'nextSize',
  'addRivets',
  'relocate',
  'doubler',
  'rework',
  'replacePart',
  'defer',
  'askKitMaker',
] as const;
export const fixKindSchema = z.enum(FIX_KINDS);
export type FixKind = z.infer<typeof fixKindSchema>;

export const FIX_KIND_WORDS: Readonly<Record<FixKind, string>> = {
  leave: 'Leave as is',
  cleanUp: 'Clean up, same rivet',
  nextSize: 'Next rivet size',
  addRivets: 'Add rivets',
  relocate: 'Relocate, fill the old',
  doubler: 'Doubler',
  rework: 'Rework',
  replacePart: 'Replace the part',
  defer: 'Put off to a due gate',
  askKitMaker: 'Ask the kit maker',
};

/** What a stamp stands on; shown by its border. */
export const BASES = ['kitMakerReply', 'drawingNote', 'handbook', 'ruleText', 'experience'] as const;
export const basisSchema = z.enum(BASES);
export type Basis = z.infer<typeof basisSchema>;

export const BASIS_WORDS: Readonly<Record<Basis, string>> = {
  kitMakerReply: 'kit maker’s reply',
  drawingNote: 'drawing note',
  handbook: 'handbook',
  ruleText: 'rule text',
  experience: 'experience',
};

export const QUESTION_STATES = [
  'open',
  'advised',
  'endorsed',
  'carriedOut',
  'referred',
  'underReview',
  'withdrawn',
] as const;
export const questionStateSchema = z.enum(QUESTION_STATES);
export type QuestionState = z.infer<typeof questionStateSchema>;

export const STATE_WORDS: Readonly<Record<QuestionState, string>> = {
  open: 'Open',
  advised: 'Advised',
  endorsed: 'Endorsed',
  carriedOut: 'Carried out',
  referred: 'Referred',
  underReview: 'Under review',
  withdrawn: 'Withdrawn',
};

export const NOTICE_CLASSES = [
  'stopWork',
  'beforeNextStep',
  'beforeClose',
  'nextInspection',
  'information',
] as const;
export const noticeClassSchema = z.enum(NOTICE_CLASSES);
export type NoticeClass = z.infer<typeof noticeClassSchema>;

export const NOTICE_CLASS_WORDS: Readonly<Record<NoticeClass, string>> = {
  stopWork: 'stop work',
  beforeNextStep: 'before next step',
  beforeClose: 'before close',
  nextInspection: 'at next inspection',
  information: 'for information',
};

/** Said on every sheet, check and print. */
export const ADVICE_LINE =
  'Advice among builders. The kit maker’s instructions and local rules stand above it; where structure or safety is in doubt a licensed engineer or mechanic decides.';
