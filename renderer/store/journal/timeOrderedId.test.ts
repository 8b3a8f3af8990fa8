import { describe, expect, it } from 'vitest';
import { timeOrderedId } from './timeOrderedId';

describe('ids', () => {
  it('have the form of a version 7 UUID, carry the time, and sort in the order they were made', () => {
    const ids = Array.from({ length: 10_000 }, () => timeOrderedId(1_790_000_000_000));
    expect(ids[0]).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-7[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/);
    expect(parseInt(ids[0]!.replaceAll('-', '').slice(0, 12), 16)).toBe(1_790_000_000_000);
    expect([...ids].sort()).toEqual(ids);
    expect(new Set(ids).size).toBe(ids.length);
  });

  it('go on rising when the clock is set back', () => {
    const before = timeOrderedId(1_790_000_100_000);
    expect(timeOrderedId(1_780_000_000_000) > before).toBe(true);
  });
});
