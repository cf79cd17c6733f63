import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation, useQuery } from '@tanstack/react-query';
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

interface KeptFormOptions<Values extends FieldValues, Body, View extends object> {
  /** What is edited; with the person it names the kept edit. */
  what: string;
  /** What is stored now; null where nothing is yet. */
  view: View | null;
  valuesOf: (view: View | null) => Values;
  /** What may be sent; it judges what is typed. */
  schema: z.ZodType<Body>;
  /** The values as a change of a version; `view` is what is known to be stored. */
  bodyOf: (values: Values, version: number | null, view: View | null) => unknown;
  send: (body: Body) => Promise<View>;
  /** Puts what the server has now in place of what was shown; null when there is nothing any more. */
  onStored?: (view: View | null) => void;
  onSaved?: (view: View, typed: Values) => void;
}

/** What somebody else stored meanwhile. */
export interface Theirs<View> {
  view: View | null;
}

/** A form whose unsaved values survive a reload, a lost session and somebody else's saving first. */
export function useKeptForm<Values extends FieldValues, Body, View extends object>(
  options: KeptFormOptions<Values, Body, View>,
) {
  const { view, valuesOf, schema, bodyOf, onStored, onSaved } = options;
  const { mutateAsync: send } = useMutation({ mutationFn: options.send, gcTime: 0 });
  const session = useQuery(sessionQuery()).data?.id ?? '';
  // Whoever began it, also when their session ends meanwhile.
  const [personId] = useState(session);
  const key = editKey(personId, options.what);
  const [begun] = useState<KeptEdit | undefined>(() => useKeptEdits.getState().edits[key]);
  const [version, setVersion] = useState(begun ? begun.version : versionOf(view));
  const [base, setBase] = useState(() => begun?.base ?? textOfValues(valuesOf(view)));
  const [theirs, setTheirs] = useState<Theirs<View>>();
  const [fault, setFault] = useState<string>();

  const resolver = useMemo(() => resolverOf(schema, bodyOf, view), [schema, bodyOf, view]);
  const form = useForm<Values>({
    defaultValues: (begun ? valuesOfText(begun.text) : valuesOf(view)) as DefaultValues<Values>,
    resolver,
  });
  const values = form.watch();
  const text = textOfValues(values);
  const changed = text !== base;

  useEffect(() => {
    if (changed) keepEdit(key, { version, base, text });
    else dropEdit(key);
  }, [changed, key, text, version, base]);

  const begin = (from: View | null) => {
    form.reset(valuesOf(from));
    setBase(textOfValues(valuesOf(from)));
    setVersion(versionOf(from));
    setTheirs(undefined);
    setFault(undefined);
    dropEdit(key);
  };

  const latest = versionOf(view);
  useEffect(() => {
    // What nobody touched here follows what somebody else stored; what was touched stays as it is.
    if (latest !== version && !changed) begin(view);
  }, [latest]);

  const store = async (typed: Values): Promise<View> => {
    try {
      return await send(schema.parse(bodyOf(typed, version, view)));
    } catch (error) {
      const current = currentIn<View>(error);
      // What somebody else changed stands elsewhere: with these values it has no conflict.
      if (!current || textOfValues(valuesOf(current.view)) !== base) throw error;
      return await send(schema.parse(bodyOf(typed, versionOf(current.view), current.view)));
    }
  };

  /** Whether what was typed is stored now. */
  const submit = async (): Promise<boolean> => {
    let done = false;
    await form.handleSubmit(async (typed) => {
      setFault(undefined);
      try {
        const saved = await store(typed);
        onStored?.(saved);
        begin(saved);
        onSaved?.(saved, typed);
        done = true;
      } catch (error) {
        const current = currentIn<View>(error);
        if (current) setTheirs(current);
        else setFault(placeFaults(error, leafPaths(form.getValues()) as FieldPath<Values>[], form.setError));
      }
    })();
    return done;
  };

  return {
    form,
    values,
    changed,
    fault,
    theirs,
    submit,
    busy: form.formState.isSubmitting,
    discard: () => begin(view),
    takeTheirs: () => {
      if (!theirs) return;
      onStored?.(theirs.view);
      begin(theirs.view);
    },
    /** The text stays, and saving it now goes over theirs. */
    keepMine: () => {
      if (!theirs) return;
      setVersion(versionOf(theirs.view));
      setBase(textOfValues(valuesOf(theirs.view)));
      setTheirs(undefined);
      onStored?.(theirs.view);
    },
  };
}

const versionOf = (view: { version?: number | null } | null): number | null => view?.version ?? null;

/** What a stale change met instead, where the server says. */
function currentIn<View>(error: unknown): Theirs<View> | undefined {
  if (!(error instanceof ApiError) || error.problem.code !== 'stale') return undefined;
  const { current } = error.problem;
  return current === undefined ? undefined : { view: current as View | null };
}

/** Judges the body that the values come to; the paths of both are the same. */
function resolverOf<Values extends FieldValues, Body, View>(
  schema: z.ZodType<Body>,
  bodyOf: (values: Values, version: number | null, view: View | null) => unknown,
  view: View | null,
): Resolver<Values> {
  const judge = zodResolver(schema as z.ZodType<Body, FieldValues>);
  return async (values, context, options) => {
    // A version is always at hand once the form is sent.
    const judged = await judge(bodyOf(values, 1, view) as FieldValues, context, options as never);
    return Object.keys(judged.errors).length > 0
      ? { values: {}, errors: judged.errors as FieldErrors<Values> }
      : { values, errors: {} };
  };
}
