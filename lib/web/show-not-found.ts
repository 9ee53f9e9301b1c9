import 'server-only';
import { notFound } from 'next/navigation';
import { AppError } from '@/lib/platform/errors';

/** For pages: waits for a use case and shows the 404 page for a thing that is not there, or not for this person. */
export async function showNotFound<T>(work: Promise<T>): Promise<T> {
  try {
    return await work;
  } catch (error) {
    if (error instanceof AppError && (error.code === 'not-found' || error.code === 'forbidden')) notFound();
    throw error;
  }
}
