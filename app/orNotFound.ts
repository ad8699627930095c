import { notFound } from 'next/navigation';
import { AppError } from '@/server/problems';

/** What a page may not show is not there: somebody else's workshop and an act outside one's roles alike. Other refusals are faults here. */
export async function orNotFound<T>(work: Promise<T>): Promise<T> {
  try {
    return await work;
  } catch (error) {
    if (error instanceof AppError && (error.kind === 'not-found' || error.kind === 'forbidden')) notFound();
    throw error;
  }
}
