import { AppError } from './errors'
import { pageData } from './page-data'

export type ListData<T> = { ok: true, data: T } | { ok: false, sentence: string, fieldErrors: Record<string, string> }

/** Reads for the page of a list: as `pageData`, and an address that leads to no page of the list comes back as its sentence. */
export async function listData<T>(read: () => Promise<T>): Promise<ListData<T>> {
  try {
    return { ok: true, data: await pageData(read) }
  } catch (error) {
    if (!(error instanceof AppError) || error.code !== 'badAddress') throw error
    return { ok: false, sentence: error.message, fieldErrors: error.fieldErrors ?? {} }
  }
}
