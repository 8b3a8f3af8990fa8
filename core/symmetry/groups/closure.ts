import { barred, identity, multiply, operationKey, type Operation } from './operation';

/** Elements of a finite double group with their products by index; the bar of element i is `bar[i]`. */
export interface GroupElements {
  readonly elements: readonly Operation[];
  readonly product: readonly (readonly number[])[];
  readonly inverse: readonly number[];
  readonly bar: readonly number[];
}

const largestDoubleGroup = 400;

/**
 * All products of the generators, the rotation by 2π among them: the double group.
 * Throws when they do not close, which means that the generators are not those of a point group.
 */
export function closeGroup(generators: readonly Operation[]): GroupElements {
  const elements: Operation[] = [identity];
  const places = new Map([[operationKey(identity), 0]]);
  for (let i = 0; i < elements.length; i++) {
    for (const generator of [barred(identity), ...generators]) {
      const next = multiply(generator, elements[i]!);
      const key = operationKey(next);
      if (places.has(key)) continue;
      places.set(key, elements.length);
      elements.push(next);
      if (elements.length > largestDoubleGroup)
        throw new Error('the generators do not close to a point group');
    }
  }
  const place = (operation: Operation): number => {
    const found = places.get(operationKey(operation));
    if (found === undefined) throw new Error('a product left the group: the generators are too inexact');
    return found;
  };
  const product = elements.map((a) => elements.map((b) => place(multiply(a, b))));
  return {
    elements,
    product,
    inverse: product.map((row) => row.indexOf(0)),
    bar: elements.map((a) => place(barred(a))),
  };
}
