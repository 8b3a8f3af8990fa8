import { describe, expect, it } from 'vitest';
import { canonicalJson } from './canonicalJson';
import { contentHash, sha256Hex } from './hash';

describe('content hashes', () => {
  it('give the digests of the worked examples of FIPS 180-4 (NIST, "SHA-256 examples")', () => {
    expect(sha256Hex('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad');
    expect(sha256Hex('abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq')).toBe(
      '248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1',
    );
    expect(sha256Hex(new Uint8Array(0))).toBe(
      'e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855',
    );
  });

  it('do not depend on the order of keys', () => {
    expect(contentHash({ b: 1, a: [1, 2] })).toBe(contentHash({ a: [1, 2], b: 1 }));
    expect(contentHash({ a: [1, 2] })).not.toBe(contentHash({ a: [2, 1] }));
  });
});

describe('canonical JSON', () => {
  // RFC 8785, section 3.2.2 (numbers) and 3.2.3 (sorting of keys by UTF-16 code units).
  it('writes numbers and orders keys as RFC 8785 shows', () => {
    expect(canonicalJson([333333333.3333333, 1e30, 4.5, 2e-3, 0.000000000000000000000000001])).toBe(
      '[333333333.3333333,1e+30,4.5,0.002,1e-27]',
    );
    const keys = { '\u20ac': 0, '\r': 0, '\ufb33': 0, '1': 0, '\ud83d\ude00': 0, '\u0080': 0, '\u00f6': 0 };
    expect(canonicalJson(keys)).toBe(
      '{"\\r":0,"1":0,"\u0080":0,"\u00f6":0,"\u20ac":0,"\ud83d\ude00":0,"\ufb33":0}',
    );
    expect(canonicalJson({ b: 1, a: 2, ab: 3 })).toBe('{"a":2,"ab":3,"b":1}');
  });

  it('refuses what JSON cannot hold and names the place', () => {
    expect(() => canonicalJson({ a: [1, Number.NaN] })).toThrow('a[1] is not finite');
    expect(() => canonicalJson({ a: { b: () => 0 } })).toThrow('a.b is a function');
  });

  it('leaves out undefined properties and reads back equal', () => {
    const value = { z: null, y: undefined, x: ['"', '\n', 'é'], w: { v: true } };
    expect(JSON.parse(canonicalJson(value))).toEqual({ z: null, x: ['"', '\n', 'é'], w: { v: true } });
  });
});
