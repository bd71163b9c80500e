import { sampleEngine as flatSix } from './samples'

/** The invented flat six as one thing, its power curve reaching down to idle. */
export const sampleEngine = flatSix({ powerCurve: [{ rpm: 600, kw: 8 }, { rpm: 1600, kw: 27 }, { rpm: 2780, kw: 50 }, { rpm: 3200, kw: 54 }] })
