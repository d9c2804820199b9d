import { defineConfig } from "drizzle-kit";

export default defineConfig({
  dialect: "postgresql",
  schema: "./db/*/tables.ts",
  out: "./db/migrations",
  casing: "snake_case",
});
