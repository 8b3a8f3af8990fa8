import { describe, expect, it } from 'vitest';
import { formatAddress, parseAddress, startAddress } from './address';

describe('addresses', () => {
  it('come back as they were written, whatever the ids hold', () => {
    for (const address of [
      startAddress,
      { view: 'library', project: null, item: 'nh3' },
      { view: 'candidates', project: 'a/b %', item: null },
      { view: 'sheet', project: 'p1', item: 'in' },
    ]) {
      expect(parseAddress(formatAddress(address))).toEqual(address);
    }
  });

  it('that make no sense lead to the start', () => {
    for (const hash of ['', '#', '#/', '#/%E0%A4%A']) expect(parseAddress(hash)).toEqual(startAddress);
  });
});
