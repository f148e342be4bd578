import { describe, expect, it } from 'vitest'
import { measureFeed } from '#server/utils/calc/measuring/measureFeed'

const house = Object.freeze([{ capacityMl: 60, stepMl: 1 }, { capacityMl: 1, stepMl: 0.01 }, { capacityMl: 3, stepMl: 0.1 }, { capacityMl: 10, stepMl: 0.2 }])
const draw = (volumeMl: number, capMl = 1000, syringes: readonly { capacityMl: number, stepMl: number }[] = house) =>
  measureFeed({ volumeMl, capMl, syringes, smallest: { marks: 2, floorMl: 0.05 }, upAtMost: 0.1 })

describe('measureFeed', () => {
  it.each([[0.41, 1, 0.41], [1, 1, 1], [1.04, 3, 1], [2.95, 3, 2.9], [3.01, 10, 3], [10.1, 60, 10]])('%s mL goes into a %s mL syringe at %s mL', (volume, capacityMl, markMl) => {
    expect(draw(volume)).toMatchObject({ syringe: { capacityMl }, markMl, draws: 1, volumeMl: markMl })
  })
  it('splits only what no syringe holds, into equal draws', () => {
    expect(draw(150)).toMatchObject({ draws: 3, markMl: 50, volumeMl: 150, syringe: { capacityMl: 60 } })
  })
  it('says null when it is too little for every syringe', () => {
    expect(draw(0.03)).toBeNull()
    expect(draw(0.07, 1, [{ capacityMl: 3, stepMl: 0.1 }])).toBeNull()
  })
  it('goes to the next syringe when the smallest cannot show so little', () => {
    expect(draw(0.3, 1, [{ capacityMl: 0.5, stepMl: 0.25 }, { capacityMl: 1, stepMl: 0.05 }])).toMatchObject({ syringe: { capacityMl: 1 }, markMl: 0.3 })
  })
  it('never passes the limit', () => expect(draw(5, 0.999)!.volumeMl).toBeLessThanOrEqual(0.999))
  it('draws up to the end of a syringe whose capacity has many decimals', () => {
    const odd = { capacityMl: 0.78446298, stepMl: 0.07844629 }
    const drawn = draw(0.9, 1000, [odd])!
    expect(drawn.markMl).toBeLessThanOrEqual(odd.capacityMl * (1 + 1e-6))
  })
  it('refuses nonsense', () => expect(() => draw(Number.NaN)).toThrow())
})
