/** What a frozen engine offers: the two steps from a document to its answer, and its version. */
export { check } from './check';
export { CheckRefused } from './check-refused';
export { ENGINE_VERSION } from './engine-version';
export { parseCheckDocument } from './parse-check';
