import { useEffect, useRef, useState } from 'react';

const pause = 700;

/** What is to be read out: a sentence once it has stood for a moment, so that not every step of a move is. */
export function useAnnouncement(sentence: string): string {
  const [spoken, setSpoken] = useState('');
  const first = useRef(sentence);
  useEffect(() => {
    // What the page opens with is read where it stands.
    if (sentence === first.current) return;
    first.current = '';
    const timer = setTimeout(() => setSpoken(sentence), pause);
    return () => clearTimeout(timer);
  }, [sentence]);
  return spoken;
}
