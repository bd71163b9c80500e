import { setTheme } from '@/app/actions'
import { formOf } from '../../support/next-mocks'
import { declare } from '../declare'

export const shell = [
  declare(setTheme, { needs: 'public', call: (fn) => fn(formOf({ theme: 'dark' })) }),
]
