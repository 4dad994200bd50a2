/** Light: sun positions and hours on a wall against published figures. */
import { getPosition } from 'suncalc'
import { describe, expect, test } from 'vitest'
import { directSun, lightOf, suggestLight } from '@/lib/light'

/** JPL Horizons positions (altitude with refraction, azimuth from north) as kept in suncalc's own fixtures, https://github.com/mourner/suncalc (read). */
const POSITIONS: [string, number, number, string, number, number][] = [
  ['Istanbul', 41.01384, 28.94966, '2026-03-20T06:00:00Z', 20.027281, 108.65225],
  ['Istanbul', 41.01384, 28.94966, '2026-03-20T12:00:00Z', 42.180069, 217.907069],
  ['Istanbul', 41.01384, 28.94966, '2026-06-21T06:00:00Z', 36.281327, 89.094224],
  ['Istanbul', 41.01384, 28.94966, '2026-06-21T12:00:00Z', 60.403174, 242.380255],
  ['Istanbul', 41.01384, 28.94966, '2026-09-23T06:00:00Z', 22.72245, 111.465343],
  ['Istanbul', 41.01384, 28.94966, '2026-09-23T12:00:00Z', 40.223471, 222.187523],
  ['Istanbul', 41.01384, 28.94966, '2026-12-21T06:00:00Z', 4.732029, 126.738675],
  ['Istanbul', 41.01384, 28.94966, '2026-12-21T12:00:00Z', 20.03775, 208.672011],
  ['Shanghai', 31.22222, 121.45806, '2026-03-20T00:00:00Z', 24.850205, 106.604187],
  ['Shanghai', 31.22222, 121.45806, '2026-03-20T06:00:00Z', 47.949372, 227.461885],
  ['Shanghai', 31.22222, 121.45806, '2026-06-21T00:00:00Z', 37.656044, 83.11207],
  ['Shanghai', 31.22222, 121.45806, '2026-06-21T06:00:00Z', 61.481435, 261.8818],
  ['Shanghai', 31.22222, 121.45806, '2026-09-23T00:00:00Z', 28.04958, 108.816454],
  ['Shanghai', 31.22222, 121.45806, '2026-09-23T06:00:00Z', 45.537659, 231.67606],
  ['Shanghai', 31.22222, 121.45806, '2026-12-21T00:00:00Z', 12.176913, 127.273543],
  ['Shanghai', 31.22222, 121.45806, '2026-12-21T06:00:00Z', 27.380234, 213.16021],
  ['Kyiv', 50.45466, 30.5238, '2026-03-20T06:00:00Z', 17.704951, 112.931832],
  ['Kyiv', 50.45466, 30.5238, '2026-03-20T12:00:00Z', 33.943617, 215.314768],
  ['Kyiv', 50.45466, 30.5238, '2026-06-21T06:00:00Z', 36.856879, 97.278104],
  ['Kyiv', 50.45466, 30.5238, '2026-06-21T12:00:00Z', 54.3277, 232.01015],
  ['Kyiv', 50.45466, 30.5238, '2026-06-21T18:00:00Z', 1.189617, 307.419846],
  ['Kyiv', 50.45466, 30.5238, '2026-09-23T06:00:00Z', 19.917598, 116.141954],
  ['Kyiv', 50.45466, 30.5238, '2026-09-23T12:00:00Z', 32.35396, 219.395052],
  ['Kyiv', 50.45466, 30.5238, '2026-12-21T06:00:00Z', 0.214791, 128.173244],
  ['Kyiv', 50.45466, 30.5238, '2026-12-21T12:00:00Z', 11.263817, 208.803605],
  ['Stockholm', 59.32938, 18.06871, '2026-03-20T06:00:00Z', 8.159198, 104.09491],
  ['Stockholm', 59.32938, 18.06871, '2026-03-20T12:00:00Z', 29.311911, 198.666578],
  ['Stockholm', 59.32938, 18.06871, '2026-06-21T06:00:00Z', 28.965324, 92.363474],
  ['Stockholm', 59.32938, 18.06871, '2026-06-21T12:00:00Z', 52.027958, 206.816412],
  ['Stockholm', 59.32938, 18.06871, '2026-06-21T18:00:00Z', 11.647603, 296.787301],
  ['Stockholm', 59.32938, 18.06871, '2026-09-23T06:00:00Z', 10.029757, 107.389749],
  ['Stockholm', 59.32938, 18.06871, '2026-09-23T12:00:00Z', 28.48656, 202.866107],
  ['Stockholm', 59.32938, 18.06871, '2026-12-21T12:00:00Z', 5.971745, 197.064617],
  ['Bogotá', 4.60971, -74.08175, '2026-03-20T12:00:00Z', 14.072348, 91.199723],
  ['Bogotá', 4.60971, -74.08175, '2026-03-20T18:00:00Z', 75.221851, 252.428624],
  ['Bogotá', 4.60971, -74.08175, '2026-06-21T12:00:00Z', 16.065308, 66.920288],
  ['Bogotá', 4.60971, -74.08175, '2026-06-21T18:00:00Z', 65.992353, 323.087135],
  ['Bogotá', 4.60971, -74.08175, '2026-09-23T12:00:00Z', 17.798926, 91.682413],
  ['Bogotá', 4.60971, -74.08175, '2026-09-23T18:00:00Z', 71.514638, 255.099324],
  ['Bogotá', 4.60971, -74.08175, '2026-12-21T12:00:00Z', 13.145889, 115.365116],
  ['Bogotá', 4.60971, -74.08175, '2026-12-21T18:00:00Z', 57.732989, 208.965264],
  ['NREL test case', 39.742476, -105.1786, '2003-10-17T19:30:30Z', 39.888378, 194.340241],
]

/**
 * Hours in which the sun stands above the horizon and within 90 degrees of the wall's bearing: spherical closed form for the
 * declinations 23.45, 18, 0 and -23.45 (computed), latitude, month, day, then N NE E SE S SW W NW.
 */
const WALLS: [number, number, number, number[]][] = [
  [30, 6, 21, [8.43, 6.5, 6.97, 7.43, 5.5, 7.43, 6.97, 6.5]],
  [30, 8, 1, [6.0, 5.92, 6.72, 7.52, 7.43, 7.52, 6.72, 5.92]],
  [30, 3, 20, [0, 4.23, 6.0, 7.77, 12.0, 7.77, 6.0, 4.23]],
  [30, 12, 21, [0, 1.95, 5.03, 8.12, 10.07, 8.12, 5.03, 1.95]],
  [35, 6, 21, [7.47, 6.38, 7.18, 7.98, 6.9, 7.98, 7.18, 6.38]],
  [35, 8, 1, [5.47, 5.78, 6.88, 7.98, 8.3, 7.98, 6.88, 5.78]],
  [35, 3, 20, [0, 4.02, 6.0, 7.98, 12.0, 7.98, 6.0, 4.02]],
  [35, 12, 21, [0, 1.63, 4.82, 8.0, 9.63, 8.0, 4.82, 1.63]],
  [40, 6, 21, [7.0, 6.32, 7.42, 8.52, 7.83, 8.52, 7.42, 6.32]],
  [40, 8, 1, [5.13, 5.67, 7.05, 8.43, 8.97, 8.43, 7.05, 5.67]],
  [40, 3, 20, [0, 3.82, 6.0, 8.18, 12.0, 8.18, 6.0, 3.82]],
  [40, 12, 21, [0, 1.32, 4.58, 7.85, 9.17, 7.85, 4.58, 1.32]],
  [45, 6, 21, [6.87, 6.33, 7.72, 9.1, 8.57, 9.1, 7.72, 6.33]],
  [45, 8, 1, [5.07, 5.63, 7.27, 8.9, 9.47, 8.9, 7.27, 5.63]],
  [45, 3, 20, [0, 3.65, 6.0, 8.35, 12.0, 8.35, 6.0, 3.65]],
  [45, 12, 21, [0, 0.97, 4.28, 7.6, 8.57, 7.6, 4.28, 0.97]],
]

describe('the sun', () => {
  test.each(POSITIONS)('over %s at %f, %f, %s', (...position) => {
    const [, latitude, longitude, time, altitude, azimuth] = position
    const found = getPosition(new Date(time), latitude, longitude)
    expect(Math.abs(found.altitude - altitude)).toBeLessThan(0.05)
    expect(Math.abs(found.azimuth - azimuth)).toBeLessThan(0.05)
  })
  /** NREL solar position algorithm, test case of the technical report (zenith 50.11162, azimuth 194.34024; read), height and pressure left out. */
  test('2003-10-17 12:30:30 at UTC-7, 39.742476 N 105.1786 W', () => {
    const found = getPosition(new Date('2003-10-17T19:30:30Z'), 39.742476, -105.1786)
    expect(Math.abs(found.altitude - 39.888)).toBeLessThan(0.05)
    expect(Math.abs(found.azimuth - 194.34)).toBeLessThan(0.05)
  })
})

describe('hours of direct sun on a wall', () => {
  test.each(WALLS)('%i N, month %i day %i', (latitude, month, day, hours) => {
    hours.forEach((expected, i) => {
      const found = directSun({ facing: i * 45, latitude, month, day })
      // Refraction lengthens a day by some minutes, and the declination of the day is not quite that of the table.
      expect(Math.abs(found - expected), `${i * 45} degrees: ${found} for ${expected}`).toBeLessThan(0.35)
    })
  })
  test('a south wall at 40 N on 21 June has 7.85 h (closed form)', () => {
    expect(directSun({ facing: 180, latitude: 40, month: 6, day: 21 })).toBeCloseTo(7.85, 0)
  })
})

/** K-State Research and Extension, Johnson County, sun and shade (read): full sun 6 h or more, part shade 4 to 6. */
test.each([[6, 'full-sun'], [5.9, 'part-shade'], [4, 'part-shade'], [3.9, 'full-shade']] as const)('%f h is %s', (hours, light) => {
  expect(lightOf(hours)).toBe(light)
})

test('in the growing season a north wall is never full sun, a south wall is', () => {
  expect(suggestLight({ facing: 0, latitude: 41.5 }).light).not.toBe('full-sun')
  expect(suggestLight({ facing: 180, latitude: 41.5 }).light).toBe('full-sun')
  expect(suggestLight({ facing: 350, latitude: 41.5 }).hours).toBeCloseTo(suggestLight({ facing: 10, latitude: 41.5 }).hours, 0)
})
