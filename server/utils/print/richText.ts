/** A text in which some words stand out. */

export interface Run { text: string, strong?: boolean }
export type RichText = string | readonly Run[]

export function strong(text: string): Run {
  return { text, strong: true }
}

export function plain(text: string): Run {
  return { text }
}

/** @example plainTextOf([strong('1 g'), plain(' of powder')]) // '1 g of powder' */
export function plainTextOf(text: RichText): string {
  return typeof text === 'string' ? text : text.map(run => run.text).join('')
}
