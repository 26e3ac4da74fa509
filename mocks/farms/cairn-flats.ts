import type { DemoFarm } from './demo-farm'

export const cairnFlats: DemoFarm = {
  slug: 'cairn-flats',
  name: 'Cairn Flats Farm',
  zone: 'America/Regina',
  units: 'metric',
  latitude: 52.1,
  longitude: -106.6,
  people: [
    { email: 'owner@secondfarm.example', name: 'Tove', role: 'owner' },
    { email: 'agronomist@brindlemarsh.example', name: 'Sefa', role: 'agronomist' },
  ],
  soils: {
    'clay': { name: 'Heavy clay', sandPct: 25, clayPct: 50, organicMatterPct: 3 },
    'clay-loam': { name: 'Clay loam', sandPct: 30, clayPct: 35, organicMatterPct: 4 },
    'loam': { name: 'Loam', sandPct: 40, clayPct: 20, organicMatterPct: 3 },
  },
  crops: {
    wheat: { name: 'Wheat', kind: 'wheat', plantingTable: 'wheat-canada', goalYieldBuPerAc: 52, priceUsdPerBu: 6.1, chain: ['dig', 'plant', 'spray'] },
    oats: { name: 'Oats', kind: 'oats', plantingTable: 'oats-canada', goalYieldBuPerAc: 88, priceUsdPerBu: 3.4, chain: ['dig', 'plant'] },
  },
  machines: [
    { name: 'Otter', pass: 'dig', driver: 'Ulla', widthFt: 50, speedMph: 6, fieldEfficiency: 0.8, fromHour: 7, toHour: 21, foldMinutes: 12, at: 'Cairn' },
    { name: 'Plover', pass: 'plant', driver: 'Gast', widthFt: 40, speedMph: 5, fieldEfficiency: 0.7, fromHour: 7, toHour: 21, foldMinutes: 15, at: 'Cairn' },
  ],
  fields: [
    { name: 'Cairn', areaAc: 148, eastKm: 0.3, northKm: 0.2, soil: 'loam', crop: 'wheat', drainage: 'tiled', residuePct: 30 },
    { name: 'Far Cairn', areaAc: 152, eastKm: 1.4, northKm: 0.5, soil: 'clay-loam', crop: 'wheat', drainage: 'somewhat-poor', residuePct: 30 },
    { name: 'Slough End', areaAc: 128, eastKm: 2.2, northKm: -0.8, soil: 'clay', crop: 'wheat', drainage: 'poor', residuePct: 40 },
    { name: 'School Section', areaAc: 310, eastKm: -1.6, northKm: 1.9, soil: 'clay-loam', crop: 'oats', drainage: 'somewhat-poor', residuePct: 30 },
    { name: 'Rail Side', areaAc: 96, eastKm: -0.8, northKm: -1.2, soil: 'loam', crop: 'oats', drainage: 'tiled', residuePct: 20 },
    { name: 'Magnetic', areaAc: 160, eastKm: 3.1, northKm: 1.6, soil: 'clay', crop: 'wheat', drainage: 'somewhat-poor', residuePct: 40 },
  ],
}
