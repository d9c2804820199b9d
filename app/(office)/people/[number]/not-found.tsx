import { Empty } from "@/components/ui/empty";

/** A number that is nobody here, or nobody of the lead's own cells. */
export default function WorkerNotFound() {
  return (
    <Empty
      act={
        <a href="/people" className="button">
          All people
        </a>
      }
    >
      Nobody with this number is here, or in your cells.
    </Empty>
  );
}
