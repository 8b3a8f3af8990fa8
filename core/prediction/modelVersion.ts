/** Grows with every change that may alter a digit of a prediction; stored with each frozen prediction. */
export const modelVersion = '2';
