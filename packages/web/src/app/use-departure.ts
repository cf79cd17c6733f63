import { useEffect, useRef } from 'react';
import { useNavigate } from 'react-router-dom';

/** Leads to another page and does the rest once this one is gone, which would otherwise ask for what is forgotten. */
export function useDeparture() {
  const navigate = useNavigate();
  const rest = useRef<() => void>(undefined);
  useEffect(() => () => rest.current?.(), []);
  return (path: string, afterwards: () => void) => {
    rest.current = afterwards;
    navigate(path);
  };
}
