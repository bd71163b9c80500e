import path from 'node:path'
import { fileURLToPath } from 'node:url'

/** The checkout. */
export const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '..', '..')

/** Everything the commands keep between runs; never under version control. */
export const dataFolder = path.join(root, '.data')

/** @param {...string} parts */
export const inData = (...parts) => path.join(dataFolder, ...parts)

/** @param {...string} parts */
export const inRoot = (...parts) => path.join(root, ...parts)
