/** Raised with every change that can move a figure or a sentence; stored with frozen results. */
export const CALCULATOR_VERSION = '1.0.0';
