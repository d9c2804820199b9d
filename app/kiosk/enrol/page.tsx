import { EnrolApp } from "@/components/door/enrol-app";

/** Makes this browser a kiosk, or moves one to another cell, with a code of an admin's. */
export default function EnrolPage() {
  return <EnrolApp />;
}
