/** A choice that no source settles: its value, its unit, and what it stands for, in words that people can read. */
export interface SoilSetting {
  value: number
  unit: string
  text: string
}

/**
 * The choices of the soil model that are judgement and not a published rule. Each is a default: it can be
 * argued with, shown beside the numbers it touches, and learned from soil checks later.
 */
export const SOIL_SETTINGS = {
  capillaryPerHour: { value: 0.011, unit: '1/h', text: 'Share of the difference in water content that moves up between two layers in an hour. No published value; middle of 0.003 to 0.04.' },
  cropCoefficient: { value: 1.1, unit: '', text: 'Evaporation of bare wet ground over the reference. FAO-56 p. 144 gives 1.2, about 1.1 where rain comes often.' },
  meltMmPerDegreeDay: { value: 3.5, unit: 'mm/°C/d', text: 'Snowmelt per degree above freezing. Open fields 3.51 over a season (Kuusisto 1980); 2.7 early to 4.5 in late April.' },
  snowAtOrBelowC: { value: 1, unit: '°C', text: 'Air temperature at or under which an hour’s rain falls as snow. The daily limit of the SWAT model’s Ames set, used by the hour.' },
  surfaceStorageMm: { value: 15, unit: 'mm', text: 'Water that stands on level tilled ground before more of it runs off. Common practice, no source.' },
  runoffShare: { value: 1, unit: '', text: 'Share of the curve-number runoff that leaves the field; on flat tiled ground some soaks in again further down.' },
  stormGapHours: { value: 12, unit: 'h', text: 'Hours without rain or melt after which the next water counts as a new storm for runoff.' },
  wetStartShare: { value: 1, unit: 'of field capacity', text: 'Water of the top 4 in at which a storm starts to meet wet ground (antecedent condition between II and III).' },
  dryStartShare: { value: 0.75, unit: 'of field capacity', text: 'Water of the top 4 in under which a storm meets drying ground (antecedent condition between II and I).' },
  dryEndShare: { value: 0.5, unit: 'of field capacity', text: 'Water of the top 4 in under which a storm meets dry ground (antecedent condition I).' },
  subsoilOrganicMatterPct: { value: 1, unit: '%', text: 'Most organic matter credited below 12 in, where the ground is not crumbed as the topsoil is.' },
  tiledMmPerDay: { value: 9.5, unit: 'mm/d', text: 'Most water that leaves below 24 in a day with tile: 3/8 in/d, a common design figure, no source.' },
  somewhatPoorMmPerDay: { value: 2, unit: 'mm/d', text: 'Most water that leaves below 24 in a day on somewhat poorly drained ground.' },
  poorMmPerDay: { value: 0.5, unit: 'mm/d', text: 'Most water that leaves below 24 in a day on poorly drained ground.' },
  fitShareClay: { value: 0.9, unit: 'of field capacity', text: 'Water of the top 4 in at or under which clay, silty clay and sandy clay are fit. Four published estimates agree on 0.90 ± 0.04: Dexter & Bird (2001), the plastic limits of heavy arable soils, Devine et al. (2022), Rutledge & McHardy (1968).' },
  fitShareClayLoam: { value: 0.92, unit: 'of field capacity', text: 'The same for clay loam and silty clay loam: between clay and loam, as Devine et al. (2022) step from 0.85 to 0.95 with less clay.' },
  fitShareLoam: { value: 0.95, unit: 'of field capacity', text: 'The same for loam, silt loam, silt and sandy clay loam: the upper end of Devine et al. (2022), and the workday limit of Rutledge & McHardy (1968).' },
  carryShare: { value: 0.95, unit: 'of field capacity', text: 'Water of the top 4 in at or under which ground carries a sprayer that doesn’t work it: the workday limit of Rutledge & McHardy (1968, as quoted by Baier 1973), which was not made for sprayers.' },
  surfaceDryMm: { value: 3, unit: 'mm', text: 'Water that must have evaporated since the last rain before the surface is dry enough to roll.' },
  practicalDrainageMmPerDay: { value: 1, unit: 'mm/d', text: 'Rate at which coarse ground counts as drained; its field capacity on paper is never reached by gravity.' },
  snowFreeMm: { value: 1, unit: 'mm', text: 'Water in the snow under which a field counts as bare.' },
  unfrozenIndex: { value: 56, unit: '°C·d', text: 'Frozen-ground index under which the frost is out (Molnau & Bissell 1983, for the Pacific Northwest).' },
  frozenIndex: { value: 83, unit: '°C·d', text: 'Frozen-ground index above which the ground is frozen (Molnau & Bissell 1983, for the Pacific Northwest).' },
  fitFromHour: { value: 8, unit: 'h', text: 'First local hour in which ground may become fit.' },
  fitToHour: { value: 20, unit: 'h', text: 'Local hour after which ground no longer becomes fit until morning.' },
  closeHours: { value: 24, unit: 'h', text: 'Ground is Close when it is fit within this many hours.' },
  seedMeanHours: { value: 72, unit: 'h', text: 'Hours over which soil temperature at 2 in is averaged before it is held against the crop’s minimum (2 to 3 days).' },
  chillC: { value: (45 - 32) / 1.8, unit: '°C', text: 'Soil at seed depth under which rain chills swallowing seed: 45 °F, Iowa State University’s figure for soybean; corn sources range from 39 to 50 °F.' },
  chillRainMm: { value: 2.54, unit: 'mm', text: 'Rain within the seed’s hours of danger that counts as cold rain: 0.1 in, no published amount.' },
  rate5: { value: 0.35, unit: '1/d', text: 'How fast the daily mean at 2 in follows the air. Set to warm faster than 4 in; to be calibrated.' },
  snowInsulatesMm: { value: 5, unit: 'mm', text: 'Water in the snow above which soil follows the air slowly.' },
  drySurfaceSwing: { value: 1.3, unit: '', text: 'Daily swing of a dry dark surface over the swing of the air; 1 when wet.' },
  residueSwingLoss: { value: 0.5, unit: '', text: 'Share of the daily swing that full residue cover takes away.' },
  warmestHour: { value: 14.5, unit: 'h', text: 'Local hour at which the surface is warmest.' },
} as const satisfies Record<string, SoilSetting>
