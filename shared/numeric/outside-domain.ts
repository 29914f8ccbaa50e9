import type { RefusalCode } from './refusal-codes.ts';

/**
 * Thrown by a formula that has no number to give. `evaluateMethod` turns it into a named refusal, so nobody else catches it.
 * `field` is the name of the argument that is wrong, as the formula spells it (`depthMm`).
 */
export class OutsideDomain extends RangeError {
  readonly code: RefusalCode;
  readonly field: string;

  constructor(code: RefusalCode, field: string) {
    super(`${code}: ${field}`);
    this.name = 'OutsideDomain';
    this.code = code;
    this.field = field;
  }
}
