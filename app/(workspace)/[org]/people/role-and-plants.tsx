'use client';

import { CheckList } from '@/components/forms/check-list';
import { ChoiceField } from '@/components/forms/choice-field';
import { ROLES, type Role } from '@/lib/auth/permissions';

export interface RoleAndPlants {
  readonly role: Role;
  /** Null: all plants, those added later too. */
  readonly plantIds: readonly string[] | null;
}

const ROLE_WORDS: Readonly<Record<Role, string>> = {
  operator: 'Operator: samples, plans, feed',
  consultant: 'Consultant: reads all, plans, sets targets',
  manager: 'Manager: approves, sets targets, invites',
  owner: 'Owner: everything, with billing',
};

const REACH = [
  { value: 'all', label: 'All plants, and those to come' },
  { value: 'named', label: 'Only these plants' },
] as const;

/** A role, and how far it reaches. */
export function RoleAndPlantsFields({
  value,
  onChange,
  plants,
  mayOwn,
}: {
  value: RoleAndPlants;
  onChange: (value: RoleAndPlants) => void;
  plants: readonly { readonly id: string; readonly name: string }[];
  mayOwn: boolean;
}) {
  const { role, plantIds } = value;
  return (
    <>
      <ChoiceField
        label="Role"
        choices={ROLES.filter((each) => mayOwn || each !== 'owner').map((each) => ({
          value: each,
          label: ROLE_WORDS[each],
        }))}
        value={role}
        onChange={(next) => onChange({ role: next, plantIds })}
      />
      <ChoiceField
        label="Where"
        choices={REACH}
        value={plantIds === null ? 'all' : 'named'}
        onChange={(reach) => onChange({ role, plantIds: reach === 'all' ? null : [] })}
      />
      {plantIds === null ? null : (
        <CheckList
          legend="Plants"
          choices={plants.map(({ id, name }) => ({ value: id, label: name }))}
          chosen={plantIds}
          onChange={(chosen) => onChange({ role, plantIds: chosen })}
        />
      )}
    </>
  );
}
