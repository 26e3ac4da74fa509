import { describe, expect, it } from 'vitest'
import { PERMISSIONS, ROLES, mayDo, type Permission } from '../../../../shared/utils/permissions'

describe('mayDo', () => {
  it('lets everyone of the farm see it', () => {
    for (const role of ROLES) expect(mayDo(role, 'farm:see')).toBe(true)
  })

  it('keeps the order with the owner', () => {
    expect(ROLES.filter(role => mayDo(role, 'order:change'))).toEqual(['owner'])
  })

  it('lets the owner do everything that anybody may', () => {
    for (const permission of Object.keys(PERMISSIONS) as Permission[]) expect(mayDo('owner', permission)).toBe(true)
  })
})
