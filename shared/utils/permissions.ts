/**
 * What each role may do: the one table. The server asks it before it answers, the pages ask it before they
 * offer. A permission that is not in the table does not exist, so a misspelt one is a type error.
 */
export const ROLES = ['owner', 'agronomist', 'operator', 'crew'] as const
export type Role = (typeof ROLES)[number]

export const PERMISSIONS = {
  'farm:see': ['owner', 'agronomist', 'operator', 'crew'],
  'passes:log': ['owner', 'agronomist', 'operator'],
  'stones:log': ['owner', 'agronomist', 'operator', 'crew'],
  'gauges:log': ['owner', 'agronomist', 'operator', 'crew'],
  'soil-checks:log': ['owner', 'agronomist', 'operator'],
  'sprays:record': ['owner', 'agronomist', 'operator'],
  'order:change': ['owner'],
  'machines:set-own-down': ['owner', 'operator'],
  'plantings:scout': ['owner', 'agronomist', 'operator'],
  'fields:write': ['owner'],
  'crops:write': ['owner', 'agronomist'],
  'soils:write': ['owner', 'agronomist'],
  'materials:write': ['owner', 'agronomist'],
  'machines:write': ['owner'],
  'people:manage': ['owner'],
  'farm:export': ['owner'],
  'self:write': ['owner', 'agronomist', 'operator', 'crew'],
  'demo-clock:move': ['owner'],
} as const satisfies Record<string, readonly Role[]>

export type Permission = keyof typeof PERMISSIONS

/** True when the role may do it. */
export function mayDo(role: Role, permission: Permission): boolean {
  return (PERMISSIONS[permission] as readonly Role[]).includes(role)
}
