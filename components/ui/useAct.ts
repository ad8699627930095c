'use client';

import { useState } from 'react';
import { ApiProblem, Unreachable } from '@/client/api';
import { type FormProblem, problemOf } from './problem';

/** Runs one call at a time and keeps what went wrong, in words. A fault of the program goes to the page's error boundary. */
export function useAct() {
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<FormProblem | null>(null);
  const [fault, setFault] = useState<{ readonly error: unknown } | null>(null);
  if (fault !== null) throw fault.error;

  /** Resolves to true when the work went through. */
  const act = async (work: () => Promise<unknown>): Promise<boolean> => {
    setBusy(true);
    setProblem(null);
    try {
      await work();
      return true;
    } catch (error) {
      if (error instanceof ApiProblem || error instanceof Unreachable) setProblem(problemOf(error));
      else setFault({ error });
      return false;
    } finally {
      setBusy(false);
    }
  };
  return { busy, problem, setProblem, act };
}
