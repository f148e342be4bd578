import { describe, expect, it } from 'vitest'
import { waitAfter } from '../../../server/utils/access/attempts'
import { isCommonPassword } from '../../../server/utils/access/commonPassword'
import { deviceOf } from '../../../server/utils/access/deviceOf'
import { sheetCodeFits, sheetCodeOf } from '../../../server/utils/access/linkKey'
import { codeStep, newCodesSecret, newRecoveryCodes } from '../../../server/utils/access/oneTimeCodes'
import { openSecret, sealSecret } from '../../../server/utils/access/sealing'

describe('one-time codes', () => {
  /** RFC 6238, appendix B, SHA-1, secret "12345678901234567890"; the last six of its eight digits. */
  const SECRET = 'GEZDGNBVGY3TQOJQGEZDGNBVGY3TQOJQ'
  it.each([[59, '94287082'], [1111111109, '07081804'], [1111111111, '14050471'], [1234567890, '89005924'], [2000000000, '69279037'], [20000000000, '65353130']])('are those of RFC 6238 at %i s', (seconds, published) => {
    expect(codeStep(SECRET, published.slice(-6), new Date(seconds * 1000))).toBe(Math.floor(seconds / 30))
  })

  it('hold one step before and after, and no further', () => {
    const at = 1111111111
    for (const [away, step] of [[30, 37037037], [-30, 37037037], [90, null], [-90, null]] as const) expect(codeStep(SECRET, '050471', new Date((at + away) * 1000))).toBe(step)
  })

  it.each(['', '12345', '1234567', 'abcdef', '０５０４７１'])('refuse %j', code => expect(codeStep(SECRET, code, new Date(1111111111000))).toBeNull())

  it('have secrets of 160 bits, as RFC 4226 advises, and ten recovery codes', () => {
    const { secret, uri } = newCodesSecret('mara@saltings.example')
    expect(secret).toMatch(/^[A-Z2-7]{32}$/)
    expect(uri).toContain(`secret=${secret}`)
    const { codes, hashes } = newRecoveryCodes()
    expect(new Set(codes).size).toBe(10)
    for (const code of codes) expect(code).toMatch(/^[0-9a-f]{10}$/)
    expect(hashes.some(hash => codes.some(code => hash.includes(code)))).toBe(false)
  })
})

describe('a sealed secret', () => {
  it('opens with the secret that sealed it, and with no other', () => {
    const sealed = sealSecret('server secret', 'GEZDGNBV')
    expect(openSecret('server secret', sealed)).toBe('GEZDGNBV')
    expect(sealed).not.toContain('GEZDGNBV')
    expect(sealSecret('server secret', 'GEZDGNBV')).not.toBe(sealed)
    expect(() => openSecret('another secret', sealed)).toThrow()
    const bytes = Buffer.from(sealed, 'base64url')
    bytes[bytes.length - 1]! ^= 1
    expect(() => openSecret('server secret', bytes.toString('base64url'))).toThrow()
  })
})

describe('isCommonPassword', () => {
  it.each(['passwordpassword', 'Password1234!', '!!!Football2026', 'qwertyuiop123', 'abcabcabcabc', '123456789012', 'lkjihgfedcba', 'aaaaaaaaaaaa', 'abababababab', 'iloveyou2026'])('refuses %s', password => expect(isCommonPassword(password)).toBe(true))
  it.each(['lantern pebble orchard nine', 'x9$kf82Lq!zz', '4839201748371', 'ž µ 亀 \'";--<b>', 'correct horse battery staple'])('takes %s', password => expect(isCommonPassword(password)).toBe(false))
  it('refuses the words of the person', () => {
    for (const password of ['mara@saltings.example', 'Saltings Rescue', 'saltings rescue 2026']) expect(isCommonPassword(password, ['mara@saltings.example', 'Mara Linde', 'Saltings Rescue'])).toBe(true)
  })
})

describe('waitAfter', () => {
  it('grows from nothing by doubling to a quarter of an hour', () => {
    expect([0, 4, 5, 6, 7, 8, 13, 14, 50].map(failures => waitAfter(failures, 5))).toEqual([0, 0, 2, 4, 8, 16, 512, 900, 900])
  })
})

describe('the code of a sheet', () => {
  it('is the same each time, another for each plan, version and server', () => {
    const code = sheetCodeOf('secret', 'juniper', 1)
    expect(code).toMatch(/^[a-hjkmnp-z2-9]{20}$/)
    expect(sheetCodeOf('secret', 'juniper', 1)).toBe(code)
    expect(new Set([code, sheetCodeOf('secret', 'juniper', 2), sheetCodeOf('secret', 'pebble', 1), sheetCodeOf('other', 'juniper', 1)]).size).toBe(4)
    expect(sheetCodeFits('secret', 'juniper', 1, code)).toBe(true)
    for (const wrong of ['', code.slice(1), `${code}a`, code.toUpperCase()]) expect(sheetCodeFits('secret', 'juniper', 1, wrong)).toBe(false)
  })
})

describe('deviceOf', () => {
  it.each([
    ['Mozilla/5.0 (Linux; Android 15) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/140.0.0.0 Mobile Safari/537.36', 'Chrome on Android'],
    ['Mozilla/5.0 (iPhone; CPU iPhone OS 18_0 like Mac OS X) AppleWebKit/605.1.15 (KHTML, like Gecko) Version/18.0 Mobile/15E148 Safari/604.1', 'Safari on iPhone'],
    ['Mozilla/5.0 (Windows NT 10.0; Win64; x64) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/140.0 Safari/537.36 Edg/140.0', 'Edge on Windows'],
    ['Mozilla/5.0 (X11; Linux x86_64; rv:140.0) Gecko/20100101 Firefox/140.0', 'Firefox on Linux'],
    ['curl/8.5', 'A program'], [undefined, 'A program'],
  ])('says %s', (agent, words) => expect(deviceOf(agent)).toBe(words))
})
