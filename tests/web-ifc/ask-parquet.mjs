// Asks the questions of an SQL file with DuckDB in a folder and prints the answers as JSON, one array of rows per question.
// Usage: node ask-parquet.mjs QUESTIONS.sql FOLDER
import { readFileSync } from "node:fs";
import { resolve } from "node:path";
import { DuckDBInstance } from "@duckdb/node-api";

const [questions, folder] = process.argv.slice(2);
if (folder === undefined) {
  process.stderr.write("Usage: node ask-parquet.mjs QUESTIONS.sql FOLDER\n");
  process.exit(64);
}

const text = readFileSync(resolve(questions), "utf8").replace(/^--.*$/gm, "");
process.chdir(folder);
const instance = await DuckDBInstance.create(":memory:");
const connection = await instance.connect();
const answers = [];
for (const question of text.split(";").map((q) => q.trim()).filter((q) => q.length > 0)) {
  const reader = await connection.runAndReadAll(question);
  answers.push(reader.getRowObjectsJson());
}

process.stdout.write(JSON.stringify(answers) + "\n");
