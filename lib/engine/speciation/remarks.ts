import type { Workspace } from './workspace';

/** The activity model is trusted to here, mol/kg. */
export const HIGHEST_IONIC_STRENGTH = 0.5;
/** A species holding less than this share of every one of its components is not worth a remark. */
const SHARE_WORTH_A_REMARK = 0.01;

/** Plain sentences about where a result leaves the range its constants or the activity model were published for. */
export function rangeRemarks(workspace: Workspace, temperatureC: number): readonly string[] {
  const { system, molality, sums, unknowns } = workspace;
  const remarks: string[] = [];
  const ionic = unknowns[system.components.length] ?? 0;
  if (ionic > HIGHEST_IONIC_STRENGTH) {
    remarks.push(
      `Ionic strength is ${ionic.toPrecision(2)} mol/kg; the activity model is trusted to ${HIGHEST_IONIC_STRENGTH}.`,
    );
  }
  const outside = system.species.filter((entry, i) => {
    const range = entry.row?.rangeC;
    if (!range || (temperatureC >= range[0] && temperatureC <= range[1])) return false;
    return system.components.some((component, column) => {
      const held = Math.abs(entry.composition[component] ?? 0) * (molality[i] ?? 0);
      return column > 0 && held > SHARE_WORTH_A_REMARK * (sums[column] ?? 0);
    });
  });
  if (outside.length > 0) {
    const names = outside.map((entry) => entry.key).join(', ');
    remarks.push(`At ${temperatureC} °C these constants are used outside their range: ${names}.`);
  }
  return remarks;
}
