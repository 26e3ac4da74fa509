import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import GroundCore from '../../app/components/ground/GroundCore.vue'
import GroundSlices from '../../app/components/ground/GroundSlices.vue'
import GroundTicks from '../../app/components/ground/GroundTicks.vue'

const chamber = (water: number) => ({ water, fit: 0.35, empty: 0.2, full: 0.5 })

describe('GroundCore', () => {
  it('shows water above the notch as wet and under it as moist', async () => {
    const core = await mountSuspended(GroundCore, { props: { core: { seedZone: chamber(0.4), below: chamber(0.3) }, ground: 'wet' } })
    expect(core.findAll('.core-level.wet')).toHaveLength(1)
    expect(core.findAll('.core-moist')).toHaveLength(1)
  })

  it('wears a cap when cold and crosses when frozen', async () => {
    const props = { core: { seedZone: chamber(0.3), below: chamber(0.3) } }
    expect((await mountSuspended(GroundCore, { props: { ...props, ground: 'cold' } })).findAll('.core-cap')).toHaveLength(1)
    expect((await mountSuspended(GroundCore, { props: { ...props, ground: 'frozen' } })).findAll('.core-ice')).toHaveLength(2)
  })
})

describe('GroundSlices', () => {
  it('has one slice a pass: done, under way, to do, not needed', async () => {
    const chain = (['done', 'part', 'to-do', 'not-needed', 'to-do'] as const).map((state, i) => ({ pass: (['dig', 'rocks', 'plant', 'roll', 'spray'] as const)[i]!, state, doneAc: 0 }))
    const slices = await mountSuspended(GroundSlices, { props: { chain } })
    expect([slices.findAll('.slice-done').length, slices.findAll('.slice-to-do').length, slices.findAll('.slice-none').length]).toEqual([2, 3, 1])
  })
})

describe('GroundTicks', () => {
  it('lights as many of ten as the chance has tenths', async () => {
    expect((await mountSuspended(GroundTicks, { props: { share: 0.46 } })).findAll('.tick-on')).toHaveLength(5)
  })
})
