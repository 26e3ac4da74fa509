import { CROP_FIGURES } from './crop'
import { MACHINE_FIGURES } from './machine-and-text'
import { RAIN_FIGURES } from './rain'
import { SOIL_FIGURES } from './soil'
import { SPRAY_FIGURES } from './spray'
import { WEATHER_FIGURES } from './weather'
import type { Figure } from './figure'

/** Every figure that Sillion shows, in the order of the page. */
export const FIGURES: readonly Figure[] = [...SOIL_FIGURES, ...WEATHER_FIGURES, ...RAIN_FIGURES, ...CROP_FIGURES, ...SPRAY_FIGURES, ...MACHINE_FIGURES]
