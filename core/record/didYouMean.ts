/** Number of single-letter edits between two words (V. I. Levenshtein, 1966; swaps count as two). */
export function editDistance(one: string, other: string): number {
  let previous = Array.from({ length: other.length + 1 }, (_, j) => j);
  for (let i = 1; i <= one.length; i++) {
    const current = [i];
    for (let j = 1; j <= other.length; j++) {
      const swap = previous[j - 1]! + (one[i - 1] === other[j - 1] ? 0 : 1);
      current.push(Math.min(swap, previous[j]! + 1, current[j - 1]! + 1));
    }
    previous = current;
  }
  return previous[other.length]!;
}

const letters = (text: string): string => text.toLowerCase().replaceAll(/[^a-z0-9]/g, '');

/** A name that may be meant, and the answer it leads to. */
export interface NamedChoice {
  readonly answer: string;
  readonly names: readonly string[];
}

/** The answers whose names look most like `text`, best first; empty where nothing is near. */
export function didYouMean(text: string, choices: readonly NamedChoice[], most = 3): string[] {
  const wanted = letters(text.slice(0, 60));
  if (wanted === '') return [];
  const scored = choices.map(({ answer, names }) => {
    const distances = [answer, ...names].map((name) => {
      const candidate = letters(name);
      if (candidate === wanted) return 0;
      const starts = wanted.length >= 3 && candidate.startsWith(wanted);
      return Math.min(editDistance(wanted, candidate), starts ? 1 : Infinity);
    });
    return { answer, distance: Math.min(...distances) };
  });
  const tolerance = wanted.length <= 3 ? 1 : wanted.length <= 6 ? 2 : 3;
  return scored
    .filter(({ distance }) => distance <= tolerance)
    .sort((a, b) => a.distance - b.distance)
    .slice(0, most)
    .map(({ answer }) => answer);
}

/** ` Did you mean nh3 or en?`, or nothing. */
export const suggestion = (answers: readonly string[]): string | undefined =>
  answers.length === 0 ? undefined : `did you mean ${answers.join(' or ')}?`;
