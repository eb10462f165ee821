// Prints a Parquet file as JSON, read by hyparquet alone: { columns: [{ name, type }], rows: [{ column: value }] }
// Usage: node read-parquet.mjs FILE
import { asyncBufferFromFile, parquetMetadataAsync, parquetReadObjects } from "hyparquet";

const path = process.argv[2];
if (path === undefined) {
  process.stderr.write("Usage: node read-parquet.mjs FILE\n");
  process.exit(64);
}

const file = await asyncBufferFromFile(path);
const metadata = await parquetMetadataAsync(file);
const columns = metadata.schema.filter((element) => element.type !== undefined).map((element) => ({ name: element.name, type: element.type }));
const rows = await parquetReadObjects({ file, metadata });
process.stdout.write(JSON.stringify({ columns, rows }, (_, value) => (typeof value === "bigint" ? Number(value) : value)) + "\n");
