import { takeTrend } from '../advance/prepare-channel'
import { takeNumber, takeOptionalNumber } from '../validate/number'
import { anySpeed, manifoldPressure } from '../validate/rules'
import { takeChoice, takeList, takeRecord } from '../validate/shape'
import { channelNames, type BenchReading } from './bench-types'

/** Checks readings and returns copies; a member that was left out stays out. `cylinders` bounds the cylinder where it is known. */
export const takeReadings = (given: unknown, cylinders?: number): BenchReading[] => {
  const list = takeList(given, 'readings', 'The list of readings', 1)
  const readings: BenchReading[] = []
  for (let i = 0; i < list.length; i += 1) {
    const field = `readings.${i}`
    const place = i + 1
    const members = takeRecord(list[i], field, `Reading ${place}`)
    const rpm = takeNumber(members.rpm, `${field}.rpm`, { ...anySpeed, name: `The speed of reading ${place}` })
    const channel = takeChoice(members.channel, `${field}.channel`, `The channel of reading ${place}`, channelNames)
    const readDeg = takeNumber(members.readDeg, `${field}.readDeg`, { name: `The angle of reading ${place}`, unit: 'deg' })
    const cylinder = takeOptionalNumber(members.cylinder, `${field}.cylinder`, {
      name: `The cylinder of reading ${place}`, unit: '', min: 1, integer: true, ...(cylinders === undefined ? {} : { max: cylinders }),
    }, undefined)
    const mapKpa = takeOptionalNumber(members.mapKpa, `${field}.mapKpa`, manifoldPressure, undefined)
    const trend = members.trend === undefined ? undefined : takeTrend(members.trend, `${field}.trend`)
    readings.push({
      rpm, channel, readDeg,
      ...(cylinder === undefined ? {} : { cylinder }), ...(mapKpa === undefined ? {} : { mapKpa }), ...(trend === undefined ? {} : { trend }),
    })
  }
  return readings
}
