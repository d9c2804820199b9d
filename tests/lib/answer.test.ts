import { describe, expect, test } from "vitest";
import { shownAgain, typedOf } from "@/lib/answer";

describe("typedOf", () => {
  test("takes text, gathers lists, and leaves files and the framework's fields out", () => {
    const form = new FormData();
    form.append("name", "Ana");
    form.append("cells[]", "neck");
    form.append("cells[]", "body");
    form.append("$ACTION_ID_1", "");
    form.append("photo", new Blob(["x"]));
    expect(typedOf(form)).toEqual({ name: "Ana", cells: ["neck", "body"] });
  });

  test("one entry of a list is a list too, and of a repeated name the last counts", () => {
    expect(
      typedOf([
        ["cells[]", "neck"],
        ["name", "Ana"],
        ["name", "Bao"],
      ]),
    ).toEqual({ cells: ["neck"], name: "Bao" });
  });
});

describe("shownAgain", () => {
  test("keeps what was typed but no secret", () => {
    const typed = { email: "a@b.example", password: "x", newPassword: "y", token: "t" };
    expect(shownAgain(typed)).toEqual({ email: "a@b.example" });
  });
});
