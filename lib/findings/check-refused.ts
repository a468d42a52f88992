import type { CheckRefusal } from './check-types';

/** A check document that the engine will not answer: where the fault is, and what it is. */
export class CheckRefused extends Error {
  override readonly name = 'CheckRefused';

  constructor(
    /** The field, as in `release.shares[2].pct`; empty for the document as a whole. */
    readonly path: string,
    message: string,
  ) {
    super(message);
  }

  toRefusal(): CheckRefusal {
    return { path: this.path, message: this.message };
  }
}
