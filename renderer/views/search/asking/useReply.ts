import { useEffect, useState } from 'react';
import type { Reply } from '../../../workers/search/protocol';
import { type Asked, type SearchAsker, searchAsker } from './searchAsker';

export interface AskedReply {
  /** The last reply; it stays while the next one is awaited. */
  readonly reply: Reply | null;
  /** Whether it belongs to what is asked now. */
  readonly current: boolean;
  readonly error: string | null;
}

/** Typing settles before a question is asked, ms. */
const settle_ms = 150;

/** The reply to a question about a wish, asked anew whenever the question changes; null asks nothing. */
export function useReply(question: Asked | null, asker: SearchAsker = searchAsker): AskedReply {
  const [answer, setAnswer] = useState<{ key: string; reply: Reply | null; error: string | null }>({
    key: '',
    reply: null,
    error: null,
  });
  const key = question === null ? '' : JSON.stringify(question);
  useEffect(() => {
    if (key === '') return;
    let current = true;
    const timer = setTimeout(() => {
      asker.ask(JSON.parse(key) as Asked).then(
        (reply) => current && setAnswer({ key, reply, error: null }),
        (error: Error) => current && setAnswer({ key, reply: null, error: error.message }),
      );
    }, settle_ms);
    return () => {
      current = false;
      clearTimeout(timer);
    };
  }, [key, asker]);
  if (key === '') return { reply: null, current: true, error: null };
  return { reply: answer.reply, error: answer.error, current: answer.key === key };
}
