import { PASSES, type Pass } from '../../../shared/agronomy/ground'
import { capacityAcPerHour } from '../../../shared/agronomy/machine/capacity'
import { roadHours, roadKm, type Point } from '../../../shared/agronomy/machine/road'
import { workingStretches } from '../../../shared/agronomy/machine/working-hours'
import type { PlanMachine } from '../../../shared/agronomy/plan/problem'
import type { FieldRow } from '../../db/queries/fields'
import type { MachineRow } from '../../db/queries/machines'
import { PASS_MACHINE } from './words'

/** Acres an hour of a machine; null when its figures are missing or impossible. */
export function rateOf({ widthFt, speedMph, fieldEfficiency }: MachineRow): number | null {
  if (widthFt === null || speedMph === null || fieldEfficiency === null) return null
  if (!(widthFt > 0 && speedMph > 0 && fieldEfficiency > 0 && fieldEfficiency <= 1)) return null
  return capacityAcPerHour({ widthFt, speedMph, fieldEfficiency })
}

/** Why a machine can't be planned, in one sentence; null when it can. */
export function whatMachineMisses(machine: MachineRow): string | null {
  if (rateOf(machine) === null) return `${machine.name} has no width, speed or field efficiency: add them on the Farm page so its hours can be planned.`
  const { fromHour, toHour } = machine
  if (!(fromHour >= 0 && toHour <= 24 && fromHour < toHour)) return `${machine.name} has no working hours: set them on the Farm page so it can be planned.`
  if (!(machine.roadMph > 0 && machine.foldMinutes >= 0)) return `${machine.name} has no road speed or folding time: set them on the Farm page so it can be planned.`
  return null
}

/** Passes that no usable machine does, each with its sentence. */
export function passesWithoutMachine(machines: readonly MachineRow[], wanted: ReadonlySet<Pass>): Map<Pass, string> {
  const usable = new Set(machines.filter(machine => whatMachineMisses(machine) === null).map(machine => machine.pass))
  return new Map(PASSES.filter(pass => wanted.has(pass) && !usable.has(pass)).map(pass =>
    [pass, `No ${PASS_MACHINE[pass]} is set: add one on the Farm page so its work can be planned`]))
}

/**
 * A machine as the plan takes it.
 *
 * Folding and unfolding take the machine's folding time together. Where it stands now is the field it was last in;
 * when nobody said, only the folding is counted.
 *
 * @param fields - of the plan, in its order
 * @param allFields - of the farm
 * @param startsAt - Unix seconds of the plan's first hour
 */
export function planMachine(machine: MachineRow, fields: readonly FieldRow[], allFields: readonly FieldRow[], localHour: Uint8Array, startsAt: number): PlanMachine {
  const foldHours = machine.foldMinutes / 60
  const move = (from: Point, to: Point) => foldHours + roadHours(roadKm(from, to), machine.roadMph)
  const at = allFields.find(field => field.id === machine.atFieldId)
  const down = machine.downUntil === null ? 0 : Math.max(0, (machine.downUntil.getTime() / 1000 - startsAt) / 3600)
  return {
    id: machine.id,
    pass: PASSES.indexOf(machine.pass),
    rateAcPerHour: rateOf(machine)!,
    working: workingStretches(machine, localHour, down),
    firstMoveHours: Float64Array.from(fields, field => field.id === at?.id ? 0 : at ? move(at, field) : foldHours),
    moveHours: Float64Array.from(fields.flatMap(from => fields.map(to => from === to ? 0 : move(from, to)))),
  }
}
