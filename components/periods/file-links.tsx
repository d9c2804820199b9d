import { fileFormats } from "@/lib/periods/file";

const words = { csv: "CSV", xlsx: "XLSX", json: "JSON" } as const;

/** The files of a closed period: the same bytes each time they are saved. */
export function FileLinks({ period }: { period: string }) {
  return (
    <p className="desk-acts">
      {fileFormats.map((format) => (
        <a
          key={format}
          className="button"
          href={`/hours/cards/file?${new URLSearchParams({ period, format })}`}
          download
        >
          Save as {words[format]}
        </a>
      ))}
    </p>
  );
}
