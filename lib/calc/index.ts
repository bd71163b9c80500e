/** The public face of the calculation library. Brings the formula parser with it; `./live` is the same without. */
import './advance/formula-mathjs'

export * from './live'
