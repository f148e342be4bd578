import { cited } from './record'

/** Rules of how long an approval stands. They are of the team's work, not of an edition's figures: each approval names what it saw. */
export const STANDING_RULES = {
  /** A weight this far from the one approved is another animal's plan. */
  weightChangePercent: cited({ value: 10, unit: '% of the approved weight', sourceKey: 'house-rule', locator: 'dosing sheet: a weight changed by 10 % asks for the dose again; taken over for feeding plans', howRead: 'house-rule' }),
} as const
