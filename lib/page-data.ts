import { forbidden, notFound } from 'next/navigation'
import { AppError } from './errors'

/** Reads for a page: what is not this shop's ends on the not-found page, what the role does not cover on the no-permission page. */
export async function pageData<T>(read: () => Promise<T>): Promise<T> {
  try {
    return await read()
  } catch (error) {
    if (error instanceof AppError && error.code === 'notFound') notFound()
    if (error instanceof AppError && error.code === 'forbidden') forbidden()
    throw error
  }
}
