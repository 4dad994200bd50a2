/** What a studio sets, as people write and read it: lengths in any form, shares in percent, minutes as numbers. */
import { formatLength, parseLength, roundLength } from '../measure'
import type { Setting } from '../spacing'

export type Value = number | string

/** A setting as text: 1'-0", 25 %, 12 min. */
export function settingText({ unit }: Pick<Setting, 'unit'>, value: number): string {
  switch (unit) {
    case 'in':
      return formatLength(value)
    case 'share':
      return `${Math.round(value * 1000) / 10} %`
    case 'min':
      return `${value} min`
  }
}

export type ReadSetting = { ok: true; value: number } | { ok: false; message: string }

const UNITS = { share: { pattern: /^(\d+(?:\.\d+)?)\s*%?$/, by: 100, word: 'percent, such as 25 %' }, min: { pattern: /^(\d+(?:\.\d+)?)\s*(?:min(?:utes?)?)?$/i, by: 1, word: 'minutes, such as 12' } } as const

/** Whether a value is what the rule has by default: nothing that the form can show apart. */
export const isDefault = (setting: Setting, value: number): boolean => settingText(setting, value) === settingText(setting, setting.default)

function readNumber({ unit }: Setting, text: string): ReadSetting {
  if (unit === 'in') {
    const length = parseLength(text)
    return length.ok ? { ok: true, value: roundLength(length.inches) } : length
  }
  const { pattern, by, word } = UNITS[unit]
  const found = pattern.exec(text.trim())
  return found ? { ok: true, value: Number(found[1]) / by } : { ok: false, message: `Write it in ${word}.` }
}

/** Reads what was typed for a setting; a number outside its range is told of with the range. Empty text is its default. */
export function readSetting(setting: Setting, text: string): ReadSetting {
  if (text.trim() === '') return { ok: true, value: setting.default }
  const read = readNumber(setting, text)
  if (!read.ok) return read
  if (isDefault(setting, read.value)) return { ok: true, value: setting.default }
  const { min, max } = setting
  if (read.value >= min && read.value <= max) return read
  return { ok: false, message: `This goes from ${settingText(setting, min)} to ${settingText(setting, max)}.` }
}

/** What a rule of a fixed kind may be called. */
export const KIND_CHOICES = ['', 'off', 'note', 'risk'] as const
