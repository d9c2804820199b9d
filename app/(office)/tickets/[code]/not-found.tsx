import { Empty } from "@/components/ui/empty";

/** A number that is no ticket here. */
export default function TicketNotFound() {
  return (
    <Empty
      act={
        <a href="/tickets" className="button">
          All tickets
        </a>
      }
    >
      There is no ticket with this number here.
    </Empty>
  );
}
