import type { Pass } from '../../shared/types/ground-order'
import type { Role } from '../../shared/utils/permissions'

/** What a demo farm is made of. All of it is invented; the farm says so wherever it shows. */
export interface DemoFarm {
  slug: string
  name: string
  zone: string
  units: 'us' | 'metric'
  latitude: number
  longitude: number
  people: { email: string, name: string, role: Role }[]
  soils: Record<string, { name: string, sandPct: number, clayPct: number, organicMatterPct: number }>
  crops: Record<string, {
    name: string
    kind: 'corn' | 'soybean' | 'wheat' | 'oats'
    /** key of a planting table; absent: the crop's own */
    plantingTable?: string
    goalYieldBuPerAc: number
    priceUsdPerBu: number
    /** which of the five passes fields of this crop get */
    chain: Pass[]
  }>
  machines: {
    name: string
    pass: Pass
    driver: string
    widthFt: number
    speedMph: number
    fieldEfficiency: number
    fromHour: number
    toHour: number
    foldMinutes: number
    /** the field it stands in when the demo starts */
    at: string
    down?: { until: string, reason: string }
  }[]
  fields: DemoField[]
}

export interface DemoField {
  name: string
  areaAc: number
  /** km east and north of the farm's own point */
  eastKm: number
  northKm: number
  soil: string
  crop: string
  drainage: 'tiled' | 'somewhat-poor' | 'poor'
  residuePct: number
  /** What was done before the demo starts, one entry a day of work. */
  worked?: { pass: Pass, localDay: string, fromHour: number, hours: number, areaAc: number }[]
}
