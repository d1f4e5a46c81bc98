import {
  BASIS_WORDS,
  type Completion,
  type Endorsement,
  type Fix,
  type Objection,
  type Referral,
  type SheetEvent,
} from '@rivetside/shared';

interface Data {
  readonly fix?: Fix;
  readonly endorsement?: Endorsement;
  readonly objection?: Objection;
  readonly completion?: Completion;
  readonly referral?: Referral;
  readonly reason?: string;
}

type Say = (data: Data) => string;
const stampOf = ({ endorsement }: Data) => `stamp ${endorsement?.stampNumber ?? ''}`.trim();

/** What happened beside the talk, in a line; the sheet itself shows the whole. */
const WORDS: Readonly<Record<Exclude<SheetEvent['type'], 'message'>, Say>> = {
  asked: () => 'asked',
  fix: ({ fix }) => `proposed fix ${fix?.number}: ${fix?.summary}`,
  fixWithdrawn: ({ fix }) => `withdrew fix ${fix?.number}: ${fix?.withdrawn?.reason}`,
  endorsement: ({ endorsement }) =>
    `gave stamp ${endorsement?.stampNumber}, ${endorsement ? BASIS_WORDS[endorsement.basis] : ''}`,
  endorsementWithdrawn: (data) => `withdrew ${stampOf(data)}: ${data.endorsement?.withdrawn?.reason}`,
  endorsementHeld: (data) => `put ${stampOf(data)} on hold: ${data.endorsement?.held?.reason}`,
  endorsementReviewed: (data) => {
    const look = data.endorsement?.reviews.at(-1);
    return `looked at ${stampOf(data)} again, ${look?.decision === 'keep' ? 'kept it' : 'took it back'}: ${look?.reason}`;
  },
  endorsementExpired: (data) => `${stampOf(data)} ran out`,
  objection: ({ objection }) => `objected: ${objection?.reason}`,
  objectionAnswered: ({ objection }) => `answered the objection: ${objection?.answered?.answer}`,
  completion: ({ completion }) => `carried it out in ${completion?.minutes} minutes`,
  referral: () => 'sent it to the kit maker',
  referralAnswer: ({ referral }) => `filed the kit maker’s answer, ${referral?.answered?.reference}`,
  withdrawn: ({ reason }) => `withdrew the question: ${reason}`,
};

export function eventWords({ type, data }: SheetEvent): string {
  return type === 'message' ? '' : WORDS[type](data as Data);
}
