// @vitest-environment happy-dom
import { cleanup, render, screen } from "@testing-library/react";
import { afterEach, expect, test } from "vitest";
import { InputField, SelectField, TextField, TickField } from "@/components/ui/field";

afterEach(cleanup);

/** The words that describe a control, in order. */
const described = (control: HTMLElement) =>
  (control.getAttribute("aria-describedby") ?? "")
    .split(" ")
    .map((id) => document.getElementById(id)?.textContent);

test("a field is found by its label and described by its hint and its error", () => {
  render(<InputField name="run" label="Run, min a piece" hint="was 50.0" error="Key a number." />);
  const run = screen.getByLabelText<HTMLInputElement>("Run, min a piece");
  expect(run.name).toBe("run");
  expect(described(run)).toEqual(["was 50.0", "Key a number."]);
  expect(run.getAttribute("aria-invalid")).toBe("true");
  expect(screen.getByRole("alert").textContent).toBe("Key a number.");
});

test("a field with nothing the matter says nothing", () => {
  render(<TextField name="because" label="Because" />);
  const because = screen.getByLabelText("Because");
  expect(because.tagName).toBe("TEXTAREA");
  expect(because.hasAttribute("aria-describedby")).toBe(false);
  expect(because.hasAttribute("aria-invalid")).toBe(false);
  expect(screen.queryByRole("alert")).toBeNull();
});

test("a choice and a tick are found by their words", () => {
  render(
    <>
      <SelectField name="cell" label="Cell" defaultValue="spray">
        <option value="neck">Neck</option>
        <option value="spray">Spray</option>
      </SelectField>
      <TickField name="mine" label="Only my cells" />
    </>,
  );
  expect(screen.getByLabelText<HTMLSelectElement>("Cell").value).toBe("spray");
  expect(screen.getByLabelText<HTMLInputElement>("Only my cells").type).toBe("checkbox");
});
