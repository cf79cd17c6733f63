import { useSuspenseQuery } from '@tanstack/react-query';
import { type ReactNode, useEffect, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { sessionQuery } from '../features/access/api/access';
import { signInPath } from './paths';

/** Pages of a person who is signed in; anyone else is led to the sign-in page, and back from there. */
export function SignedIn({ children }: { children: ReactNode }) {
  const navigate = useNavigate();
  const { data: person } = useSuspenseQuery(sessionQuery());
  const [cameIn] = useState(person !== null);

  useEffect(() => {
    // The browser’s address: it may be that of a page on its way, which the session’s end kept from opening.
    if (!person) navigate(signInPath(location), { replace: true, state: { expired: cameIn } });
  }, [person, cameIn, navigate]);

  // Who was in keeps the page until the sign-in page is there.
  return cameIn && children;
}
