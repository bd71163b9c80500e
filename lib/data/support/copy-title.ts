const before = 'Copy of '

/** `Copy of …`, once, cut to the longest name allowed. */
export const copyTitle = (title: string, longest: number): string =>
  (title.startsWith(before) ? title : before + title).slice(0, longest).toWellFormed().trimEnd()
