import type { DemoFarm, DemoField } from './demo-farm'

const GRAIN = ['dig', 'plant'] as const
const ROW_CROP = ['dig', 'rocks', 'plant'] as const

/** A field that was planted before the demo starts: every pass through Plant on the days named. */
function planted(field: Omit<DemoField, 'worked'>, chain: readonly ('dig' | 'rocks' | 'plant')[], dug: string, sown: string): DemoField {
  return {
    ...field,
    worked: chain.map(pass => ({
      pass,
      localDay: pass === 'plant' ? sown : dug,
      fromHour: { dig: 8, rocks: 10, plant: 9 }[pass],
      hours: 9,
      areaAc: field.areaAc,
    })),
  }
}

export const brindleMarsh: DemoFarm = {
  slug: 'brindle-marsh',
  name: 'Brindle Marsh Farm',
  zone: 'America/Chicago',
  units: 'us',
  latitude: 46.9,
  longitude: -96.8,
  people: [
    { email: 'owner@brindlemarsh.example', name: 'Runa', role: 'owner' },
    { email: 'operator@brindlemarsh.example', name: 'Ines', role: 'operator' },
    { email: 'crew@brindlemarsh.example', name: 'Bo', role: 'crew' },
    { email: 'agronomist@brindlemarsh.example', name: 'Sefa', role: 'agronomist' },
  ],
  // Textures and organic matter of the eight default soils in the soil model's own table.
  soils: {
    'black-clay': { name: 'Black clay', sandPct: 25, clayPct: 50, organicMatterPct: 3 },
    'silty-clay': { name: 'Lake-bed silty clay', sandPct: 5, clayPct: 50, organicMatterPct: 4.5 },
    'silty-clay-loam': { name: 'Silty clay loam', sandPct: 10, clayPct: 33, organicMatterPct: 4 },
    'clay-loam': { name: 'Clay loam', sandPct: 30, clayPct: 35, organicMatterPct: 4 },
    'loam': { name: 'Bench loam', sandPct: 40, clayPct: 20, organicMatterPct: 3 },
    'sandy-loam': { name: 'Beach-ridge sandy loam', sandPct: 65, clayPct: 10, organicMatterPct: 2 },
  },
  crops: {
    corn: { name: 'Corn', kind: 'corn', goalYieldBuPerAc: 180, priceUsdPerBu: 4.3, chain: ['dig', 'rocks', 'plant', 'spray'] },
    soybeans: { name: 'Soybeans', kind: 'soybean', goalYieldBuPerAc: 46, priceUsdPerBu: 10.2, chain: ['dig', 'rocks', 'plant', 'roll', 'spray'] },
    wheat: { name: 'Wheat', kind: 'wheat', goalYieldBuPerAc: 66, priceUsdPerBu: 6.1, chain: ['dig', 'plant', 'spray'] },
    oats: { name: 'Oats', kind: 'oats', goalYieldBuPerAc: 95, priceUsdPerBu: 3.6, chain: ['dig', 'plant'] },
  },
  machines: [
    { name: 'Badger', pass: 'dig', driver: 'Ansel', widthFt: 60, speedMph: 6, fieldEfficiency: 0.8, fromHour: 6, toHour: 21, foldMinutes: 12, at: 'Big Kettle' },
    { name: 'Magpie', pass: 'rocks', driver: 'Bo', widthFt: 45, speedMph: 6, fieldEfficiency: 0.8, fromHour: 7, toHour: 20, foldMinutes: 10, at: 'Big Kettle' },
    { name: 'Jay', pass: 'plant', driver: 'Ines', widthFt: 60, speedMph: 5.5, fieldEfficiency: 0.65, fromHour: 6, toHour: 21, foldMinutes: 15, at: 'Schoolhouse' },
    { name: 'Toad', pass: 'roll', driver: 'Pia', widthFt: 45, speedMph: 6, fieldEfficiency: 0.85, fromHour: 7, toHour: 20, foldMinutes: 10, at: 'Cut Bank', down: { until: '2025-05-07T17:00:00Z', reason: 'bearing' } },
    { name: 'Skunk', pass: 'spray', driver: 'Odd', widthFt: 120, speedMph: 12, fieldEfficiency: 0.65, fromHour: 6, toHour: 21, foldMinutes: 8, at: 'Cut Bank' },
  ],
  fields: [
    // In play on the morning that the demo starts.
    {
      name: 'Schoolhouse', areaAc: 236, eastKm: 0.6, northKm: 0.4, soil: 'loam', crop: 'wheat', drainage: 'tiled', residuePct: 20,
      worked: [
        { pass: 'dig', localDay: '2025-05-05', fromHour: 8, hours: 7, areaAc: 236 },
        { pass: 'plant', localDay: '2025-05-05', fromHour: 16, hours: 4, areaAc: 90 },
      ],
    },
    { name: 'Big Kettle', areaAc: 312, eastKm: 1.9, northKm: 0.8, soil: 'clay-loam', crop: 'corn', drainage: 'tiled', residuePct: 20 },
    { name: 'Long Slough', areaAc: 188, eastKm: 3.4, northKm: -0.6, soil: 'silty-clay-loam', crop: 'corn', drainage: 'tiled', residuePct: 30 },
    { name: 'Widow’s Quarter', areaAc: 156, eastKm: 4.3, northKm: -0.9, soil: 'clay-loam', crop: 'soybeans', drainage: 'somewhat-poor', residuePct: 40 },
    { name: 'Stonepile', areaAc: 204, eastKm: -2.1, northKm: 2.6, soil: 'sandy-loam', crop: 'soybeans', drainage: 'tiled', residuePct: 40 },
    { name: 'Ferry Road', areaAc: 148, eastKm: 6.2, northKm: 1.1, soil: 'black-clay', crop: 'soybeans', drainage: 'tiled', residuePct: 40 },
    { name: 'North Bench', areaAc: 224, eastKm: -1.2, northKm: 7.4, soil: 'loam', crop: 'corn', drainage: 'tiled', residuePct: 70 },
    { name: 'Crow Corner', areaAc: 132, eastKm: -4.6, northKm: -1.8, soil: 'black-clay', crop: 'soybeans', drainage: 'somewhat-poor', residuePct: 50 },
    { name: 'Elevator Eighty', areaAc: 80, eastKm: 2.5, northKm: -3.9, soil: 'silty-clay', crop: 'oats', drainage: 'somewhat-poor', residuePct: 30 },
    { name: 'Dry Lake', areaAc: 268, eastKm: 7.9, northKm: -4.6, soil: 'silty-clay', crop: 'soybeans', drainage: 'poor', residuePct: 60 },
    { name: 'Lantern', areaAc: 118, eastKm: 0.1, northKm: -2.2, soil: 'loam', crop: 'soybeans', drainage: 'tiled', residuePct: 30 },
    // Planted before the wet spell and between its rains.
    planted({ name: 'Cut Bank', areaAc: 164, eastKm: -0.7, northKm: -0.9, soil: 'sandy-loam', crop: 'corn', drainage: 'tiled', residuePct: 30 }, ROW_CROP, '2025-05-03', '2025-05-04'),
    planted({ name: 'Mill Quarter', areaAc: 158, eastKm: 1.2, northKm: -1.4, soil: 'loam', crop: 'corn', drainage: 'tiled', residuePct: 20 }, ROW_CROP, '2025-05-04', '2025-05-05'),
    planted({ name: 'Gravel Pit', areaAc: 122, eastKm: -2.8, northKm: 3.4, soil: 'sandy-loam', crop: 'corn', drainage: 'tiled', residuePct: 30 }, ROW_CROP, '2025-05-04', '2025-05-04'),
    planted({ name: 'Home Eighty', areaAc: 78, eastKm: 0.2, northKm: 0.1, soil: 'loam', crop: 'oats', drainage: 'tiled', residuePct: 20 }, GRAIN, '2025-04-20', '2025-04-20'),
    planted({ name: 'Signal Hill', areaAc: 160, eastKm: -3.6, northKm: 4.4, soil: 'sandy-loam', crop: 'wheat', drainage: 'tiled', residuePct: 30 }, GRAIN, '2025-04-19', '2025-04-20'),
    planted({ name: 'Old Orchard', areaAc: 96, eastKm: -0.4, northKm: 1.2, soil: 'loam', crop: 'wheat', drainage: 'tiled', residuePct: 20 }, GRAIN, '2025-04-20', '2025-04-21'),
    planted({ name: 'Three Ricks', areaAc: 162, eastKm: -4.4, northKm: 5.1, soil: 'sandy-loam', crop: 'wheat', drainage: 'tiled', residuePct: 30 }, GRAIN, '2025-04-20', '2025-04-21'),
    planted({ name: 'Tamarack', areaAc: 148, eastKm: -5.2, northKm: 3.2, soil: 'loam', crop: 'wheat', drainage: 'tiled', residuePct: 30 }, GRAIN, '2025-04-24', '2025-04-24'),
    planted({ name: 'Ridge South', areaAc: 184, eastKm: -3.1, northKm: 2.2, soil: 'sandy-loam', crop: 'wheat', drainage: 'tiled', residuePct: 30 }, GRAIN, '2025-04-24', '2025-04-25'),
    planted({ name: 'Ridge North', areaAc: 176, eastKm: -3.4, northKm: 5.8, soil: 'sandy-loam', crop: 'wheat', drainage: 'tiled', residuePct: 30 }, GRAIN, '2025-04-25', '2025-04-25'),
    planted({ name: 'Badlands', areaAc: 132, eastKm: 5.4, northKm: 4.8, soil: 'loam', crop: 'oats', drainage: 'tiled', residuePct: 20 }, GRAIN, '2025-04-25', '2025-04-26'),
    planted({ name: 'Bridge Forty', areaAc: 40, eastKm: 2.2, northKm: 2.3, soil: 'loam', crop: 'oats', drainage: 'tiled', residuePct: 20 }, GRAIN, '2025-04-29', '2025-04-29'),
    planted({ name: 'Creek Bend', areaAc: 144, eastKm: 2.9, northKm: 3.1, soil: 'loam', crop: 'wheat', drainage: 'tiled', residuePct: 20 }, GRAIN, '2025-04-29', '2025-04-30'),
    planted({ name: 'East Section', areaAc: 168, eastKm: 7.1, northKm: 3.6, soil: 'loam', crop: 'wheat', drainage: 'tiled', residuePct: 20 }, GRAIN, '2025-04-29', '2025-04-30'),
    planted({ name: 'Windbreak', areaAc: 154, eastKm: -1.9, northKm: 0.6, soil: 'sandy-loam', crop: 'corn', drainage: 'tiled', residuePct: 30 }, ROW_CROP, '2025-04-30', '2025-05-03'),
    planted({ name: 'Pump House', areaAc: 126, eastKm: 3.8, northKm: 1.9, soil: 'loam', crop: 'corn', drainage: 'tiled', residuePct: 20 }, ROW_CROP, '2025-05-04', '2025-05-05'),
    planted({ name: 'Sheep Camp', areaAc: 140, eastKm: -5.8, northKm: 0.9, soil: 'sandy-loam', crop: 'corn', drainage: 'tiled', residuePct: 30 }, ROW_CROP, '2025-05-03', '2025-05-03'),
    planted({ name: 'Section Nine', areaAc: 196, eastKm: 4.9, northKm: 6.2, soil: 'loam', crop: 'wheat', drainage: 'tiled', residuePct: 20 }, GRAIN, '2025-04-30', '2025-05-01'),
    planted({ name: 'Potter’s Field', areaAc: 104, eastKm: 0.9, northKm: 3.8, soil: 'loam', crop: 'wheat', drainage: 'tiled', residuePct: 20 }, GRAIN, '2025-05-03', '2025-05-04'),
    planted({ name: 'Far Corner', areaAc: 82, eastKm: -6.4, northKm: 6.6, soil: 'sandy-loam', crop: 'oats', drainage: 'tiled', residuePct: 30 }, GRAIN, '2025-04-26', '2025-04-26'),
  ],
}
