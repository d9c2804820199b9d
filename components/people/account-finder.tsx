import Form from "next/form";
import { Icon } from "@/components/ui/icon";

/** Finds accounts by a part of a name or e-mail; what is sought stands in the address. */
export function AccountFinder({ text }: { text: string }) {
  return (
    <Form action="/people/accounts" role="search" className="sentence">
      {"with "}
      <input
        key={text}
        name="q"
        type="search"
        size={14}
        aria-label="Part of a name or e-mail"
        defaultValue={text}
      />
      <button type="submit" aria-label="Find" className="desk-find">
        <Icon name="find" />
      </button>
      {" in name or e-mail"}
    </Form>
  );
}
