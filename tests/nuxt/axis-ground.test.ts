import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import AxisGround from '../../app/components/axis/AxisGround.vue'

const axis = { startsAt: '2025-05-10T10:00:00Z', hours: 72, pxPerHour: 5.4 }
const line = (early: string | null, median: string | null, late: string | null) => ({ status: 'known' as const, earlyAt: early, medianAt: median, lateAt: late, share: 0.6, likelyMm: 12, thresholdMm: 2.54 })
const mount = (rainLine: ReturnType<typeof line>) => mountSuspended(AxisGround, { props: { axis, rainLine, ribbon: null, top: 0, bottom: 54, faint: true } })

describe('AxisGround', () => {
  it('lets the rain line and its early and late hour fall through', async () => {
    const drawn = await mount(line('2025-05-11T10:00:00Z', '2025-05-11T20:00:00Z', '2025-05-12T10:00:00Z'))
    expect(drawn.get('.rain-line').attributes('d')).toBe('M183.6 0V54')
    expect(drawn.get('.spread').attributes()).toMatchObject({ x: '129.6', width: '129.6' })
  })

  it('draws neither where they lie behind the days that it shows', async () => {
    const drawn = await mount(line('2025-05-14T14:00:00Z', '2025-05-15T02:00:00Z', null))
    expect([drawn.findAll('.rain-line').length, drawn.findAll('.spread').length]).toEqual([0, 0])
  })

  it('starts the spread at now when rain may have started, and ends it at the last hour', async () => {
    const drawn = await mount(line('2025-05-10T09:00:00Z', '2025-05-12T20:00:00Z', null))
    expect(drawn.get('.spread').attributes()).toMatchObject({ x: '0', width: '388.8' })
  })
})
