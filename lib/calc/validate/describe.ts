/** Shows any value in a few words, for an error message. Never throws, never runs the value's own code. */
export const describeValue = (value: unknown): string => {
  if (value === undefined) return 'nothing'
  if (value === null) return 'an empty value'
  switch (typeof value) {
    case 'number':
      if (Number.isNaN(value)) return 'something that is not a number'
      if (value === Infinity) return 'infinity'
      if (value === -Infinity) return 'minus infinity'
      return String(value).replace('-', '−')
    case 'string':
      return `the text “${value.length > 40 ? `${value.slice(0, 40)}…` : value}”`
    case 'boolean':
      return String(value)
    case 'object':
      return Array.isArray(value) ? 'a list' : 'an object'
    case 'function':
      return 'a function'
    default:
      return `a ${typeof value}`
  }
}
