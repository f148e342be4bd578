/** Plain lists of the plan's contract, apart from the schemas so that a screen can use them without the validator. */

export const LIFE_STAGES = ['adult', 'growing', 'breeding'] as const
export type LifeStage = (typeof LIFE_STAGES)[number]

/** Signs a person can tick. `closes` says what each does to the gate. */
export const SIGNS = {
  'unresponsive': { label: 'Does not respond when touched', closes: 'do-not-feed' },
  'convulsing': { label: 'Fits, twitches or trembles', closes: 'do-not-feed' },
  'cannot-swallow': { label: 'Cannot swallow', closes: 'do-not-feed' },
  'cannot-hold-head-up': { label: 'Cannot hold its head up', closes: 'do-not-feed' },
  'open-mouth-breathing': { label: 'Breathes with its mouth open, bubbles or clicks', closes: 'do-not-feed' },
  'blockage-suspected': { label: 'Belly hard or swollen, or something hangs from the vent', closes: 'do-not-feed' },
  'crop-full': { label: 'Crop still full from before', closes: 'do-not-feed' },
  'no-droppings-yet': { label: 'Young bird that has passed no droppings yet', closes: 'wait' },
  'brought-up': { label: 'Brought up food in the last 24 hours', closes: 'wait' },
  'mouth-sore': { label: 'Sore, swollen or broken mouth, beak or jaw', closes: null },
  'skin-tents': { label: 'Skin stays up when pinched', closes: null },
  'eyes-sunken': { label: 'Eyes sunken', closes: null },
  'swollen': { label: 'Swelling under the skin or in the limbs', closes: null },
  'fed-by-finder': { label: 'Already fed or watered by the finder', closes: null },
  'mouth-and-swallow-checked': { label: 'Mouth looked at, no sores; swallows when touched', closes: null },
} as const satisfies Record<string, { label: string, closes: 'do-not-feed' | 'wait' | null }>
export type Sign = keyof typeof SIGNS
export const SIGN_IDS = Object.keys(SIGNS) as [Sign, ...Sign[]]

export const PAPERS = ['a4', 'letter'] as const
export type Paper = (typeof PAPERS)[number]
