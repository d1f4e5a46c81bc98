import { SHOP_HEAD } from '../../trade/limits.js';
import type { HoleCardLimits } from '../card-fields.js';
import type { Reading } from '../geometry/hole-views.js';
import type { CheckCode, CheckLine, Verdict } from '../hole-card.schema.js';
import { errorOf, known, said, valueOf, type Measured } from '../measured.js';
import { reaches } from '../sums/require.js';
import { againstMinimum, judged, settledBy, sourceOf } from './judge.js';

export interface ShopHead {
  readonly width?: Measured | null | undefined;
  readonly height?: Measured | null | undefined;
}

interface HeadRule {
  readonly id: string;
  readonly label: string;
  /** In D: replaced below this. */
  readonly limit: number;
  readonly source: string;
  readonly usual: number;
}

function headCode(reading: Reading, { limit, usual }: HeadRule, isWide: boolean): CheckCode {
  const side = againstMinimum(reading, limit);
  if (side === 'outside') return 'reject';
  if (side === 'tooClose') return 'too_close_to_call';
  if (reaches(reading.value, usual)) return 'ok';
  return isWide ? 'overdriven' : 'below_nominal';
}

function headVerdict(code: CheckCode): Verdict {
  if (code === 'ok') return 'inside';
  return code === 'reject' ? 'outside' : 'marginal';
}

const REMARKS: Partial<Readonly<Record<CheckCode, string>>> = {
  reject: 'Replace the rivet.',
  overdriven: 'Wide and flat: struck too often. Look for cracks and a dished sheet.',
};

function headLine(measured: Measured, diameter: number, rule: HeadRule, isWide: boolean): CheckLine {
  const reading = { value: valueOf(measured) / diameter, error: errorOf(measured) / diameter };
  const code = headCode(reading, rule, isWide);
  const remark =
    code === 'too_close_to_call' ? settledBy(valueOf(measured) - rule.limit * diameter) : REMARKS[code];
  const facts = { id: rule.id, label: rule.label, unit: 'D' as const, source: rule.source };
  return judged(
    facts,
    reading,
    { limit: rule.limit, verdict: headVerdict(code), code },
    {
      formula: `${said(valueOf(measured))} / ${said(diameter)} = ${said(reading.value)}, at least ${rule.limit}`,
      remark: remark ?? null,
    },
  );
}

function ruleOf(what: 'width' | 'height', limits: HoleCardLimits | null): HeadRule {
  const isWidth = what === 'width';
  const kit = isWidth ? limits?.shopHeadMinimumWidthD : limits?.shopHeadMinimumHeightD;
  const published = isWidth ? SHOP_HEAD.widthReject : SHOP_HEAD.heightReject;
  return {
    id: `shopHead:${what}`,
    label: `Shop head, ${what}`,
    limit: kit ?? published.value,
    source: known(kit) ? limits!.source : sourceOf(published),
    usual: (isWidth ? SHOP_HEAD.widthUsual : SHOP_HEAD.heightUsual).value,
  };
}

/** The driven head, width and height, in D of the rivet that was driven (dash in 1/32 inch). What was not measured has no line. */
export function headChecks(head: ShopHead, dash: number, limits: HoleCardLimits | null): CheckLine[] {
  const diameter = dash / 32;
  const { width, height } = head;
  const isWide = known(width) && valueOf(width) / diameter > SHOP_HEAD.widthOver.value;
  return [
    ...(known(width) ? [headLine(width, diameter, ruleOf('width', limits), false)] : []),
    ...(known(height) ? [headLine(height, diameter, ruleOf('height', limits), isWide)] : []),
  ];
}
