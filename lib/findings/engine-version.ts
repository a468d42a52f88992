/** Rises with every change that moves a number of an answer; `npm run engine:freeze` then keeps that version. */
export const ENGINE_VERSION = '1.0.1';
