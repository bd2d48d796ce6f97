import type { FieldFault } from '~/domain/errors';

/** The sentence of a fault by its pointer inside the solid: `/height`. */
export type FaultAt = (pointer: string) => string | undefined;

export function faultAtOf(faults: readonly FieldFault[]): FaultAt {
  return (pointer) => faults.find((fault) => fault.pointer === pointer)?.detail;
}
