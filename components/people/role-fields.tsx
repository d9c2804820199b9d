"use client";

import { FormField } from "@/components/shell/form-field";
import type { Sent } from "@/components/shell/use-answer";
import { TickField } from "@/components/ui/field";
import type { Held } from "@/lib/access/may";
import { roles } from "@/lib/access/roles";

const siteRoles = roles.filter((role) => role !== "lead");

/** What an account may do: roles for the whole site, cells that it leads, and whose hours are its own. */
export function RoleFields({
  sent,
  held,
  cells,
  worker,
}: {
  sent: Sent<unknown>;
  held: readonly Held[];
  cells: readonly { id: string; name: string }[];
  worker: string;
}) {
  const chosenRoles = sent.typedList("roles") ?? held.map(({ role }) => role as string);
  const chosenCells = sent.typedList("cells") ?? held.flatMap((each) => each.cells);
  const error = sent.errorOf("roles");
  return (
    <>
      <fieldset className="desk-ticks">
        <legend>Roles for the whole site</legend>
        {siteRoles.map((role) => (
          <TickField
            key={role}
            label={role}
            name="roles[]"
            value={role}
            defaultChecked={chosenRoles.includes(role)}
          />
        ))}
      </fieldset>
      <fieldset className="desk-ticks">
        <legend>Lead of</legend>
        {cells.map(({ id, name }) => (
          <TickField
            key={id}
            label={name}
            name="cells[]"
            value={id}
            defaultChecked={chosenCells.includes(id)}
          />
        ))}
      </fieldset>
      {error && <p className="field-error">{error}</p>}
      <FormField
        sent={sent}
        name="worker"
        label="Is the worker with number"
        hint="For own hours, and a lead's acts at the kiosk. Leave empty for nobody."
        inputMode="numeric"
        value={worker}
      />
    </>
  );
}
