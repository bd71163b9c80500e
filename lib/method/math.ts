import 'server-only'
import temml from 'temml'

/** Parts of a formula that may stand under each other where the page is narrow. */
const partsOf = (tex: string): string[] => tex.split(/,?\s*\\qquad\s*/)

/** Formula as MathML, one display formula for each part. A fault in the TeX throws. */
export const displayMath = (tex: string): string[] => partsOf(tex).map((part) => temml.renderToString(part, { displayMode: true, throwOnError: true }))

/** A symbol inside a line. */
export const inlineMath = (tex: string): string => temml.renderToString(tex, { throwOnError: true })
