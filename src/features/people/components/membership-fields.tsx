import { useQuery } from '@tanstack/react-query';
import { useFieldArray, type UseFormReturn } from 'react-hook-form';
import type { z } from 'zod';
import type { newPersonSchema } from '../../../../shared/schemas/people.ts';
import { ROLES } from '../../../../shared/schemas/roles.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { roleName } from '../../members/roles-in-words.ts';
import { schemesQuery } from '../../schemes/api/list-schemes.ts';
import type { Invitation } from '../invitation.ts';

const ROLE_OPTIONS = ROLES.map((role) => ({ value: role, label: roleName(role) }));

type MembershipFieldsProps = {
  readonly form: UseFormReturn<Invitation, unknown, z.output<typeof newPersonSchema>>;
  readonly blank: Readonly<Invitation['memberships'][number]>;
};

/** Schemes and roles that somebody gets with their account. */
export function MembershipFields({ form, blank }: MembershipFieldsProps) {
  const { data: schemes = [] } = useQuery(schemesQuery);
  const { fields, append, remove } = useFieldArray({ control: form.control, name: 'memberships' });
  const options = schemes
    .filter(({ archivedAt }) => archivedAt === null)
    .map(({ id, name }) => ({ value: id, label: name }));
  return (
    <fieldset className="grid gap-2.5">
      <legend className="sr-only">Schemes</legend>
      {fields.map((field, index) => (
        <div key={field.id} className="grid grid-cols-[minmax(0,1fr)_118px_auto] items-end gap-2">
          <Select
            label={index === 0 ? 'Scheme' : `Scheme ${index + 1}`}
            options={options}
            unchosen="None"
            {...form.register(`memberships.${index}.schemeId`)}
          />
          <Select
            label={index === 0 ? 'Role' : `Role ${index + 1}`}
            options={ROLE_OPTIONS}
            {...form.register(`memberships.${index}.role`)}
          />
          {fields.length > 1 && (
            <Button
              kind="quiet"
              aria-label={`Remove line ${index + 1}`}
              onClick={() => {
                remove(index);
              }}
            >
              Remove
            </Button>
          )}
        </div>
      ))}
      <Button
        kind="quiet"
        className="-ml-1.5 justify-self-start"
        onClick={() => {
          append({ ...blank });
        }}
      >
        Another scheme or role
      </Button>
    </fieldset>
  );
}
