import { Empty } from "@/components/ui/empty";

/** What someone sees whose role does not open a page. */
export default function Forbidden() {
  return (
    <>
      <h1 className="sr-only">Not for your role</h1>
      <Empty
        act={
          <a href="/" className="button">
            Go to your first page
          </a>
        }
      >
        This page is not for your role. An admin can open it for you.
      </Empty>
    </>
  );
}
