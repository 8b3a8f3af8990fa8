import { describe, expect, it } from 'vitest';
import { operationKey, turned } from '../groups/operation';
import { pointGroup, pointGroupNames } from '../pointGroup';
import { rotationAbout } from '../rotation';
import { schoenflies } from './schoenflies';

describe('recognition of a point group from its operations', () => {
  it('finds every group of the catalogue in its own orientation', () => {
    for (const name of pointGroupNames()) {
      expect(schoenflies(pointGroup(name).elements.elements).name).toBe(name);
    }
  });

  it('finds it in any orientation, with the frame that carries the standard operations onto those given', () => {
    const frame = rotationAbout([0.2, -0.7, 0.4], 1.1);
    for (const name of pointGroupNames()) {
      const { elements } = pointGroup(name).elements;
      const given = elements.map((operation) => turned(operation, frame));
      const found = schoenflies(given);
      expect(found.name).toBe(name);
      const keys = new Set(given.map(operationKey));
      for (const operation of elements) {
        expect(keys.has(operationKey(turned(operation, found.frame))), name).toBe(true);
      }
    }
  });
});
