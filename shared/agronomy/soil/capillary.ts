/**
 * Water that moves up into a drier layer in an hour, driven by the difference in wetness relative to field capacity.
 * For two layers of one soil this is share × difference in water content × thickness of the thinner layer.
 *
 * Source: none published for the share; a design choice, shown as a setting.
 *
 * @param upperWater - of the layer above, m³/m³
 * @param upperCapacity - its field capacity, m³/m³
 * @param lowerWater - of the layer below, m³/m³
 * @param lowerCapacity - its field capacity, m³/m³
 * @param thinnerMm - thickness of the thinner of the two, mm
 * @param sharePerHour - 1/h
 * @returns mm upwards, 0 when the upper layer is not the drier one
 */
export function capillaryRiseMm(upperWater: number, upperCapacity: number, lowerWater: number, lowerCapacity: number, thinnerMm: number, sharePerHour: number): number {
  const pull = lowerWater * upperCapacity / lowerCapacity - upperWater
  return pull > 0 ? sharePerHour * pull * thinnerMm : 0
}
