import Link from "next/link";
import { SeamNotice } from "@/components/shell/seam-notice";

/** No page at this address. */
export default function NotFound() {
  return (
    <SeamNotice title="There is no page here.">
      <p>The address may be old, or a letter is missing.</p>
      <Link href="/" className="button" data-tone="solid" data-rim="right">
        Go to the start
      </Link>
    </SeamNotice>
  );
}
