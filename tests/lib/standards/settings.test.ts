import { expect, test } from 'vitest'
import { STANDARDS, type Setting } from '@/lib/spacing'
import { readSetting, settingText } from '@/lib/standards'

const named = (name: string): Setting => STANDARDS.flatMap(({ settings }) => settings).find((setting) => setting.name === name)!

test('lengths in every form, shares in percent, minutes as numbers', () => {
  expect(readSetting(named('wall-gap.gap'), `1'-6"`)).toEqual({ ok: true, value: 18 })
  expect(readSetting(named('wall-gap.gap'), '30 cm')).toMatchObject({ ok: true, value: expect.closeTo(11.8125, 4) })
  expect(readSetting(named('crowding.unlike'), '15 %')).toEqual({ ok: true, value: 0.15 })
  expect(readSetting(named('upkeep.low'), '7 min')).toEqual({ ok: true, value: 7 })
})
test('nothing typed is the default, and so is the default as it is shown', () => {
  for (const setting of STANDARDS.flatMap(({ settings }) => settings)) {
    expect(readSetting(setting, '  ')).toEqual({ ok: true, value: setting.default })
    expect(readSetting(setting, settingText(setting, setting.default)), setting.name).toEqual({ ok: true, value: setting.default })
    expect(readSetting(setting, settingText(setting, setting.max)).ok, setting.name).toBe(true)
    expect(readSetting(setting, settingText(setting, setting.min)).ok, setting.name).toBe(true)
  }
})
test('what cannot be read or is out of range gets a sentence', () => {
  expect(readSetting(named('wall-gap.gap'), 'wide')).toMatchObject({ ok: false, message: expect.stringMatching(/\.$/) })
  expect(readSetting(named('wall-gap.gap'), '9 ft')).toEqual({ ok: false, message: `This goes from 0" to 4'-0".` })
  expect(readSetting(named('crowding.unlike'), 'a tenth')).toMatchObject({ ok: false })
})
test('every setting has a range that holds its default, a unit, and every rule a source that says how it is known', () => {
  for (const { id, settings, sources, question } of STANDARDS) {
    expect(question, id).toMatch(/\?$/)
    expect(sources.length, id).toBeGreaterThan(0)
    for (const { publisher, title, address, known } of sources) {
      expect(publisher && title, id).toBeTruthy()
      expect(known === 'read' ? address : 'no address needed', id).toMatch(known === 'read' ? /^https?:\/\// : /./)
    }
    for (const setting of settings) {
      expect(setting.name.startsWith(`${id}.`), setting.name).toBe(true)
      expect(setting.default).toBeGreaterThanOrEqual(setting.min)
      expect(setting.default).toBeLessThanOrEqual(setting.max)
    }
  }
})
