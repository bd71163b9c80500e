type Library = Readonly<Record<string, unknown>>

/**
 * The same library, each function keeping its last answer. Several figures of one published example come from one call, and a fault tree
 * or a fit need not be worked out for each. Only for arguments that came as JSON: they are compared as such.
 */
export function rememberLast(library: Library): Library {
  const wrap = (call: (...args: unknown[]) => unknown) => {
    let last: { asked: string, answer: unknown } | null = null
    return (...args: unknown[]): unknown => {
      const asked = JSON.stringify(args)
      if (last?.asked !== asked) last = { asked, answer: call(...args) }
      return last.answer
    }
  }
  return Object.fromEntries(Object.entries(library).map(([name, member]) => [name, typeof member === 'function' ? wrap((...args) => Reflect.apply(member, undefined, args)) : member]))
}
