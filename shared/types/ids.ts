/** Identifiers are text; the brand keeps a field's id from being passed where a machine's is wanted. */
declare const brand: unique symbol
type Branded<Name extends string> = string & { readonly [brand]: Name }

export type FarmId = Branded<'farm'>
export type PersonId = Branded<'person'>
export type SessionId = Branded<'session'>
export type FieldId = Branded<'field'>
export type SoilId = Branded<'soil'>
export type CropId = Branded<'crop'>
export type MachineId = Branded<'machine'>
export type PassRecordId = Branded<'pass record'>
export type PlaceId = Branded<'place'>
export type ForecastId = Branded<'forecast'>
/** A calendar day at the farm, `YYYY-MM-DD` in the farm's zone. */
export type LocalDay = Branded<'local day'>
/** An instant, ISO 8601 in UTC, as it travels in JSON. */
export type Instant = string
