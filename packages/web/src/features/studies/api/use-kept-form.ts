import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useMemo, useState } from 'react';
import {
  type DefaultValues,
  type FieldErrors,
  type FieldPath,
  type FieldValues,
  type Resolver,
  useForm,
} from 'react-hook-form';
import type { z } from 'zod';
import { ApiError } from '../../../shared/api/client';
import { placeFaults } from '../../../shared/api/faults';
import { sessionQuery } from '../../access/api/access';
import { leafPaths } from '../model/differences';
import {
  dropEdit,
  editKey,
  type KeptEdit,
  keepEdit,
  textOfValues,
  useKeptEdits,
  valuesOfText,
} from '../model/kept-edits';
import { studiesQuery } from './studies';

interface Versioned {
  version: number;
}

interface KeptFormOptions<Values extends FieldValues, Body, View extends Versioned> {
  /** What is edited; with the person it names the kept edit. */
  what: string;
  /** What is stored now; null where nothing is yet. */
  view: View | null;
  valuesOf: (view: View | null) => Values;
  /** What may be sent; it judges what is typed. */
  schema: z.ZodType<Body>;
  bodyOf: (values: Values, version: number | null) => unknown;
  send: (body: Body) => Promise<View>;
  /** Puts what the server has now in place of what was shown; null when it was removed. */
  onStored: (view: View | null) => void;
  onSaved?: (view: View) => void;
}

/** What somebody else stored meanwhile. */
export interface Theirs<View> {
  view: View | null;
}

/** A form whose unsaved values survive a reload, a lost session and somebody else's saving first. */
export function useKeptForm<Values extends FieldValues, Body, View extends Versioned>(
  options: KeptFormOptions<Values, Body, View>,
) {
  const { view, valuesOf, schema, bodyOf, send, onStored, onSaved } = options;
  const queryClient = useQueryClient();
  const personId = useQuery(sessionQuery()).data?.id ?? '';
  const key = editKey(personId, options.what);
  const [begun] = useState<KeptEdit | undefined>(() => useKeptEdits.getState().edits[key]);
  const [version, setVersion] = useState(begun ? begun.version : (view?.version ?? null));
  const [origin, setOrigin] = useState(() => (begun ? null : textOfValues(valuesOf(view))));
  const [theirs, setTheirs] = useState<Theirs<View>>();
  const [fault, setFault] = useState<string>();

  const stored = valuesOf(view);
  const resolver = useMemo(() => resolverOf(schema, bodyOf), [schema, bodyOf]);
  const form = useForm<Values>({
    defaultValues: (begun ? valuesOfText(begun.text) : stored) as DefaultValues<Values>,
    resolver,
  });
  const values = form.watch();
  const text = textOfValues(values);
  const changed = text !== textOfValues(stored);

  useEffect(() => {
    if (changed) keepEdit(key, { version, text });
    else dropEdit(key);
  }, [changed, key, text, version]);

  const begin = (from: View | null) => {
    form.reset(valuesOf(from));
    setOrigin(textOfValues(valuesOf(from)));
    setVersion(from?.version ?? null);
    setTheirs(undefined);
    setFault(undefined);
    dropEdit(key);
  };

  const latest = view?.version ?? null;
  useEffect(() => {
    // What nobody touched here follows what somebody else stored; what was touched stays as it is.
    if (latest !== version && text === origin) begin(view);
  }, [latest]);

  const submit = form.handleSubmit(async (typed) => {
    setFault(undefined);
    try {
      const saved = await send(schema.parse(bodyOf(typed, version)));
      onStored(saved);
      begin(saved);
      onSaved?.(saved);
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      if (error.problem.code === 'stale') setTheirs({ view: (error.problem.current ?? null) as View | null });
      else setFault(placeFaults(error, leafPaths(form.getValues()) as FieldPath<Values>[], form.setError));
      // Where the session has ended, what is asked for next finds it out and leads to the sign-in page.
      if (error.status === 401) await queryClient.prefetchQuery({ ...studiesQuery(), staleTime: 0 });
    }
  });

  return {
    form,
    values,
    changed,
    fault,
    theirs,
    submit,
    discard: () => begin(view),
    takeTheirs: () => {
      if (!theirs) return;
      onStored(theirs.view);
      begin(theirs.view);
    },
    /** The text stays, and saving it now goes over theirs. */
    keepMine: () => {
      if (!theirs) return;
      setVersion(theirs.view?.version ?? null);
      setTheirs(undefined);
      onStored(theirs.view);
    },
  };
}

/** Judges the body that the values come to; the paths of both are the same. */
function resolverOf<Values extends FieldValues, Body>(
  schema: z.ZodType<Body>,
  bodyOf: (values: Values, version: number | null) => unknown,
): Resolver<Values> {
  const judge = zodResolver(schema as z.ZodType<Body, FieldValues>);
  return async (values, context, options) => {
    // A version is always at hand once the form is sent.
    const judged = await judge(bodyOf(values, 1) as FieldValues, context, options as never);
    return Object.keys(judged.errors).length > 0
      ? { values: {}, errors: judged.errors as FieldErrors<Values> }
      : { values, errors: {} };
  };
}
