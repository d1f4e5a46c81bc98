/**
 * What the shell itself reads of the wire. Always imported at the time of need (`await import('./answers')`): the first
 * page of a stranger reads nothing, and the schemas are a fifth of its script.
 */
export { buildSchema, meSchema, pageOf, signedInSchema } from '@rivetside/shared';
