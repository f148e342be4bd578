import { describe, expect, it } from 'vitest'
import { chooseMeal } from '#server/utils/calc/meals/chooseMeal'
import { measureFeed } from '#server/utils/calc/measuring/measureFeed'

const syringes = [{ capacityMl: 1, stepMl: 0.01 }, { capacityMl: 10, stepMl: 0.2 }]
const draw = (volumeMl: number, capMl: number) => measureFeed({ volumeMl, capMl, syringes, smallest: { marks: 2, floorMl: 0.05 }, upAtMost: 0.1 })
const base = { densityKcalPerMl: 1, strengths: [0.25, 0.5, 0.75, 1], start: 1, feeds: { usual: 3, most: 4 }, mealCapMl: 0.5, dayCapMl: null, waterCapMl: null, waterFraction: 0.8, thickenFirst: false }

describe('chooseMeal', () => {
  it('begins thin with the usual meals', () => {
    expect(chooseMeal({ ...base, energyKcal: 0.3 }, draw)).toMatchObject({ strengthFraction: 0.5, feeds: 3, measured: { markMl: 0.2 }, bounds: [] })
  })
  it('adds meals before it thickens early on', () => {
    expect(chooseMeal({ ...base, energyKcal: 0.9 }, draw)).toMatchObject({ strengthFraction: 0.5, feeds: 4 })
  })
  it('thickens before it adds meals later', () => {
    expect(chooseMeal({ ...base, energyKcal: 0.9, thickenFirst: true }, draw)).toMatchObject({ strengthFraction: 0.75, feeds: 3 })
  })
  it('cuts to the limit and says so when all is used up', () => {
    const meal = chooseMeal({ ...base, energyKcal: 9 }, draw)!
    expect(meal).toMatchObject({ strengthFraction: 1, feeds: 4, measured: { markMl: 0.5 } })
    expect(meal.bounds).toEqual(expect.arrayContaining(['meal-cap', 'most-feeds', 'full-strength', 'short']))
  })
  it('thins what is too little to measure, then feeds less often', () => {
    // 0.08 kcal at half strength is 0.16 mL in 3 feeds of 0.053 mL: measurable as it is.
    expect(chooseMeal({ ...base, energyKcal: 0.08 }, draw)).toMatchObject({ strengthFraction: 0.5, feeds: 3 })
    expect(chooseMeal({ ...base, energyKcal: 0.04 }, draw)).toMatchObject({ strengthFraction: 0.25, feeds: 3, bounds: ['thinned'] })
    expect(chooseMeal({ ...base, energyKcal: 0.02 }, draw)).toMatchObject({ strengthFraction: 0.25, feeds: 1, bounds: ['thinned', 'fewer-feeds'] })
  })
  it('never pretends: null when not even one meal can be measured', () => {
    expect(chooseMeal({ ...base, energyKcal: 0.01 }, draw)).toBeNull()
    expect(chooseMeal({ ...base, energyKcal: 0.3, mealCapMl: 0.03 }, draw)).toBeNull()
  })
  it('thickens for the day\'s water and the day\'s volume', () => {
    expect(chooseMeal({ ...base, energyKcal: 0.5, waterCapMl: 0.7, mealCapMl: 5 }, draw)).toMatchObject({ strengthFraction: 0.75, bounds: ['water-cap'] })
    expect(chooseMeal({ ...base, energyKcal: 0.5, dayCapMl: 0.7, mealCapMl: 5 }, draw)).toMatchObject({ strengthFraction: 0.75, bounds: ['day-cap'] })
  })
  it('refuses nothing', () => expect(() => chooseMeal({ ...base, energyKcal: 0 }, draw)).toThrow())
})
