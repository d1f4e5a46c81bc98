import { MEASURING_TOOLS, type MeasuringTool } from '@rivetside/shared';

/** What a length was measured with; `none` tells no error, as for a number from the drawing. */
export type Tool = MeasuringTool | 'none';
export const TOOLS: readonly Tool[] = ['caliper', 'rule', 'pins', 'photo', 'none'];

export const TOOL_WORDS: Readonly<Record<Tool, string>> = {
  caliper: 'caliper',
  rule: 'steel rule',
  pins: 'pins',
  photo: 'photo',
  none: 'no error',
};

/** Its usual measuring error, inch; null where none is told. */
export function toolError(tool: Tool): number | null {
  return MEASURING_TOOLS.find((one) => one.tool === tool)?.error ?? null;
}

/** The tool whose usual error that is; null where no tool has it. */
export function toolOfError(u: number | null): Tool | null {
  if (!u) return 'none';
  return MEASURING_TOOLS.find(({ error }) => Math.abs(error - u) < 1e-9)?.tool ?? null;
}
