import type { CaseChoices } from '#shared/contracts/cases.ts';
import type { Reader } from '../../../database/connection.ts';
import { listMaterials } from '../../materials/service/keep-material.ts';
import { listOrganisationNames, listStaff } from '../queries/choices.ts';

/** What the forms of a case offer. */
export async function listChoices(reader: Reader): Promise<CaseChoices> {
  const [analysts, staff, organisations, materials] = await Promise.all([
    listStaff(reader, ['analyst']),
    listStaff(reader, ['analyst', 'engineer', 'manager']),
    listOrganisationNames(reader),
    listMaterials(reader),
  ]);
  return { analysts, staff, organisations, materials: materials.map(({ id, name }) => ({ id, name })) };
}
