import { KioskApp } from "@/components/door/kiosk-app";

/** A static shell: all that a kiosk knows it keeps itself. */
export default function KioskPage() {
  return <KioskApp />;
}
