import { SOIL_SETTINGS } from './settings'

/**
 * Turns planting hours into cold ones where the soil at seed depth falls under the chilling limit within the hours in
 * which swallowing seed is in danger, and rain in those hours carries the cold to it.
 *
 * Source: 45 °F for soybean (Iowa State University extension; corn sources range from 39 to 50 °F); 48 h for corn,
 * 24 h for soybean (University of Nebraska extension). The rain that sets it off is a design choice. Hours behind the
 * end of the arrays are not known and hold nobody back.
 *
 * @param temperature5C - at 2 in, °C, by the hour
 * @param rainMm - mm in each hour
 * @param hours - of the arrays that count
 * @param chillHours - whole hours in danger after planting; 0: nothing is changed
 * @param plant - 1 where planting may go on; cleared where it must wait
 * @param cold - set to 1 there
 */
export function holdForColdRain(temperature5C: Float64Array, rainMm: Float64Array, hours: number, chillHours: number, plant: Uint8Array, cold: Uint8Array): void {
  if (chillHours === 0) return
  let nextCold = Infinity
  let rainAhead = 0
  for (let hour = hours - 1; hour >= 0; hour--) {
    rainAhead += rainMm[hour]!
    if (hour + chillHours < hours) rainAhead -= rainMm[hour + chillHours]!
    if (temperature5C[hour]! < SOIL_SETTINGS.chillC.value) nextCold = hour
    if (plant[hour] === 1 && nextCold - hour < chillHours && rainAhead >= SOIL_SETTINGS.chillRainMm.value - 1e-9) {
      plant[hour] = 0
      cold[hour] = 1
    }
  }
}
