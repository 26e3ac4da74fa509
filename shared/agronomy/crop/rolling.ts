/** When soybean ground may be rolled (DeJong-Hughes, Holen & Glogoza, UMN 2008–10; NDSU; SDSU). */

export type RollingVerdict = 'good' | 'do-not' | 'with-care' | 'not-recommended'

export interface RollingState {
  /** hours since planting; null: not planted yet */
  sincePlantingH: number | null
  /** emerged share, 0 to 1 */
  emerged: number
  /** trifoliate leaf stage, 0 for VC and before */
  leafStage: number
  soilWet: boolean
}

/** Hours behind planting that count as 'within hours of planting'; UMN names no number, so this is a setting. */
const SOON_H = 24
const HALF_EMERGED = 0.5
const LAST_STAGE = 2

/**
 * @returns good before or right behind the planter; never between that and emergence, when stems snap under the crust;
 *   with care from half emerged to V2, in the warm part of the day; not recommended from V3 on
 * @throws {RangeError} when hours are negative or a share outside 0 to 1
 */
export function rollingVerdict({ sincePlantingH, emerged, leafStage, soilWet }: RollingState): RollingVerdict {
  if ((sincePlantingH !== null && !(sincePlantingH >= 0)) || !(emerged >= 0 && emerged <= 1) || !(leafStage >= 0)) throw new RangeError('Hours and leaf stage must be at least 0, the emerged share 0 to 1')
  if (soilWet) return 'do-not'
  if (sincePlantingH === null || (sincePlantingH <= SOON_H && emerged === 0)) return 'good'
  if (emerged < HALF_EMERGED) return 'do-not'
  return leafStage > LAST_STAGE ? 'not-recommended' : 'with-care'
}
