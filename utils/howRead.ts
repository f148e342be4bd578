import type { HowRead } from '#shared/types/reference'

/** How a number came to us, in words. Empty where nothing needs saying. */
export const HOW_READ_WORDS: Record<HowRead, string> = {
  'original': 'read in the source',
  'restated': 'restated elsewhere',
  'memory': 'from memory',
  'practice': 'common practice',
  'computed': 'worked out',
  'house-rule': 'house rule',
  'demo': 'demo, invented',
}
