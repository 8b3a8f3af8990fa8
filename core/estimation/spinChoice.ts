/** The spin state a d^n ion is taken in; the same for ions that have no choice. */
export type SpinChoice = 'high' | 'low';
