import { randomBytes, timingSafeEqual } from 'node:crypto';

/** Compares without telling by its duration how much was right. */
function same(given: string, right: string): boolean {
  const a = Buffer.from(given);
  const b = Buffer.from(right);
  return a.length === b.length && timingSafeEqual(a, b);
}

/**
 * Tells the window that the program opened from every other that may find the port: the window comes with a code that
 * works once and gets a cookie for it. Without the cookie the page works, but reaches no file.
 */
export class LocalSession {
  readonly #key = randomBytes(32).toString('base64url');
  #codes = new Set<string>();
  /** Cookies do not know ports: two servers on this machine must not take each other's place. */
  readonly #name = `spinhue-${randomBytes(6).toString('hex')}`;

  newCode(): string {
    const code = randomBytes(18).toString('base64url');
    this.#codes.add(code);
    return code;
  }

  /** The cookie for a fresh code; null for a code that is unknown or used. */
  redeem(code: string): string | null {
    if (!this.#codes.delete(code)) return null;
    return `${this.#name}=${this.#key}; HttpOnly; SameSite=Strict; Path=/`;
  }

  isKnown(cookies: string | undefined): boolean {
    return (cookies ?? '').split(';').some((pair) => {
      const [name, value] = pair.trim().split('=', 2);
      return name === this.#name && value !== undefined && same(value, this.#key);
    });
  }
}
