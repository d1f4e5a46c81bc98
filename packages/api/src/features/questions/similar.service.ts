import { Injectable } from '@nestjs/common';
import type { Actor, HoleCard, Mishap, SimilarAsked, SimilarQuery, SimilarQuestion } from '@rivetside/shared';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { SearchService } from '../search/search.service.js';
import { QuestionDoorService } from './question-door.service.js';
import { QuestionListService } from './question-list.service.js';
import { SAME_PLACE, SAME_PLACE_ANYWHERE, SIMILAR_FACTS } from './questions.sql.js';

const SHOWN = 5;
/** Place first, then the rivet, then words: house order until cases are compared by geometry. */
const WEIGHTS = { part: 4, section: 2, rivet: 2, head: 1, words: 2 } as const;

interface Facts {
  id: string;
  mishap: Mishap;
  partId: string | null;
  sectionId: string | null;
  holeCard: string | null;
}

/** Cases met before, with what is alike and what differs said in words. */
@Injectable()
export class SimilarService {
  constructor(
    private readonly reader: PreparedReader,
    private readonly door: QuestionDoorService,
    private readonly lists: QuestionListService,
    private readonly searching: SearchService,
  ) {}

  find(actor: Actor, query: SimilarQuery, except?: string): SimilarQuestion[] {
    const words = query.text
      ? this.searching.questionHits(actor, anyWord(query.text)).slice(0, SHOWN * 4)
      : [];
    const candidates = new Map(this.samePlace(actor, query).map((facts) => [facts.id, facts]));
    for (const id of words)
      if (!candidates.has(id)) candidates.set(id, this.reader.get<Facts>(SIMILAR_FACTS, [id])!);
    const judged = [...candidates.values()]
      .filter(({ id }) => id !== except)
      .map((facts) => ({ facts, ...judge(query, facts, words.includes(facts.id)) }))
      .filter(({ score }) => score > 0)
      .sort((a, b) => b.score - a.score)
      .slice(0, SHOWN);
    const rows = new Map(
      this.lists
        .byIds(
          actor,
          judged.map(({ facts }) => facts.id),
        )
        .map((row) => [row.id, row]),
    );
    return judged.map(({ facts, alikeIn, differsIn, score }) => ({
      question: rows.get(facts.id)!,
      alikeIn,
      differsIn,
      score,
      holeCard: cardOf(facts),
    }));
  }

  /** Beside a question that the actor may see, or for a place and words. */
  toAsked(actor: Actor, { questionId, ...place }: SimilarAsked): SimilarQuestion[] {
    if (!questionId) return this.find(actor, place);
    this.door.requireVisible(actor, questionId);
    const facts = this.reader.get<Facts & { title: string }>(SIMILAR_FACTS, [questionId])!;
    const { sectionId, partId, title } = facts;
    return this.find(actor, { sectionId, partId, holeCard: cardOf(facts), text: title }, questionId);
  }

  private samePlace(actor: Actor, { sectionId, partId }: SimilarQuery): Facts[] {
    if (!sectionId) return [];
    const { chapters, kits, everything } = this.door.sightOf(actor);
    const place = { sectionId, partId: partId ?? null };
    if (everything) return this.reader.all<Facts>(SAME_PLACE_ANYWHERE, place);
    return this.reader.all<Facts>(SAME_PLACE, { ...place, chapters, kits });
  }
}

function cardOf({ holeCard }: Facts): HoleCard | null {
  return holeCard === null ? null : (JSON.parse(holeCard) as HoleCard);
}

/** Words of a sentence are looked for one by one: a whole sentence is nobody else's. */
function anyWord(text: string): string {
  return text
    .split(/\s+/)
    .sort((a, b) => b.length - a.length)
    .slice(0, 2)
    .join(' ');
}

function judge(query: SimilarQuery, facts: Facts, byWords: boolean) {
  const card = cardOf(facts);
  const asked = query.holeCard;
  const points: [alike: boolean, known: boolean, name: string, weight: number][] = [
    [facts.partId === query.partId, Boolean(query.partId && facts.partId), 'part', WEIGHTS.part],
    [facts.sectionId === query.sectionId, Boolean(query.sectionId), 'section', WEIGHTS.section],
    [card?.rivet.dash === asked?.rivet.dash, Boolean(card && asked), 'rivet size', WEIGHTS.rivet],
    [
      card?.rivet.head === asked?.rivet.head,
      Boolean(card?.rivet.head && asked?.rivet.head),
      'rivet head',
      WEIGHTS.head,
    ],
    [byWords, byWords, 'words', WEIGHTS.words],
  ];
  const known = points.filter(([, isKnown]) => isKnown);
  const alike = known.filter(([isAlike]) => isAlike);
  return {
    alikeIn: alike.map(([, , name]) => name),
    differsIn: known.filter(([isAlike]) => !isAlike).map(([, , name]) => name),
    score: alike.reduce((sum, [, , , weight]) => sum + weight, 0),
  };
}
