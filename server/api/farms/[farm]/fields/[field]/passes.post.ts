import { NewPassRecord } from '#shared/schemas/passes'
import { logPass } from '../../../../../services/log-pass'

export default defineEventHandler(async (event) => {
  const context = await requireFarm(event, 'passes:log')
  const entry = await readBodyAs(event, NewPassRecord)
  const { farm, person, now } = context
  return answerWrite(event, context, entry, (tx) => {
    const logged = logPass(tx, farm, getRouterParam(event, 'field') ?? '', person.id, now, entry)
    switch (logged.outcome) {
      case 'no-field': return fail(404, 'not-found', 'There is no such field.')
      case 'no-machine': return fail(404, 'not-found', 'There is no such machine.', 'machineId')
      case 'wrong-machine': return fail(422, 'wrong-machine', 'That machine does not do this pass.', 'machineId')
      case 'too-long-ago': return fail(422, 'too-long-ago', 'The end lies more than two years back. Check the year.', 'endedAt')
      case 'not-in-chain': return fail(422, 'not-in-chain', 'This field does not get that pass this season.', 'pass')
      case 'in-the-future': return fail(422, 'in-the-future', 'The end lies in the future.', 'endedAt')
      case 'too-many-acres': return fail(422, 'too-many-acres', `Only ${Math.max(0, Math.round(logged.leftAc))} ac are left of this pass. Check the number.`, 'areaAc')
      case 'logged': return { status: 201, answer: logged.record, audit: { action: 'logged', subject: 'pass', subjectId: logged.record.id, before: { doneAc: logged.doneBeforeAc }, after: logged.record } }
    }
  })
})
