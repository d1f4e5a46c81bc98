import { StandardSchemaValidationPipe } from '@nestjs/common';
import type { StandardSchemaV1 } from '@standard-schema/spec';
import { BadInput, type FieldFault } from '../errors/app-error.js';

const FAULTS_TOLD = 50;

/** `layers.0.thickness`: where in the body, as the page names its fields. */
function dotted(path: StandardSchemaV1.Issue['path']): string {
  return (path ?? []).map((part) => String(typeof part === 'object' ? part.key : part)).join('.');
}

export function faultsOf(issues: readonly StandardSchemaV1.Issue[]): FieldFault[] {
  return issues.slice(0, FAULTS_TOLD).map(({ path, message }) => ({ path: dotted(path), message }));
}

/** Every body and query is checked by the schema named beside it; the answer carries each fault with its path. */
export const validationPipe = new StandardSchemaValidationPipe({
  exceptionFactory: (issues) => new BadInput(faultsOf(issues), 'Some of it cannot be taken as it stands.'),
});
