// Answers the benchmark question with web-ifc alone: every member with its section's dimensions through representation, mapped item and
// profile, all property sets and quantities of occurrence and type, strings decoded. Prints one line.
// Usage: node answer-question.mjs FILE
import { openSync, readSync } from "node:fs";
import {
  IFCELEMENTQUANTITY, IFCEXTRUDEDAREASOLID, IFCMAPPEDITEM, IFCMEMBER, IFCPROPERTYSET, IFCRELDEFINESBYPROPERTIES, IFCRELDEFINESBYTYPE, IfcAPI, LogLevel,
} from "web-ifc";

const path = process.argv[2];
if (path === undefined) {
  process.stderr.write("Usage: node answer-question.mjs FILE\n");
  process.exit(64);
}

const api = new IfcAPI();
await api.Init();
api.SetLogLevel(LogLevel.LOG_LEVEL_ERROR);
const file = openSync(path, "r");
const model = api.OpenModelFromCallback((offset, size) => {
  const part = Buffer.alloc(size);
  const count = readSync(file, part, 0, size, offset);
  return part.subarray(0, count);
});

const ids = (keyword) => {
  const vector = api.GetLineIDsWithType(model, keyword);
  return Array.from({ length: vector.size() }, (_, i) => vector.get(i));
};
const line = (id) => api.GetLine(model, id);

const setsOf = new Map();
for (const id of ids(IFCRELDEFINESBYPROPERTIES)) {
  const relation = line(id);
  for (const object of relation.RelatedObjects) {
    if (!setsOf.has(object.value)) setsOf.set(object.value, []);
    setsOf.get(object.value).push(relation.RelatingPropertyDefinition.value);
  }
}
const typeOf = new Map();
for (const id of ids(IFCRELDEFINESBYTYPE)) {
  const relation = line(id);
  for (const object of relation.RelatedObjects) typeOf.set(object.value, relation.RelatingType.value);
}

const answer = { members: 0, dimensions: 0, sumOfDimensions: 0, sets: 0, properties: 0, quantities: 0, sumOfValues: 0, characters: 0 };
const text = (value) => {
  if (typeof value?.value === "string" && value.type !== 3) answer.characters += value.value.length;
};

const items = (representation) => {
  for (const reference of representation.Items) {
    const item = line(reference.value);
    if (item.type === IFCMAPPEDITEM) {
      items(line(line(item.MappingSource.value).MappedRepresentation.value));
    } else if (item.type === IFCEXTRUDEDAREASOLID) {
      const profile = line(item.SweptArea.value);
      for (const [name, value] of Object.entries(profile)) {
        if (["expressID", "type", "ProfileType", "ProfileName", "Position"].includes(name) || typeof value?.value !== "number") continue;
        answer.dimensions += 1;
        answer.sumOfDimensions += value.value;
      }
    }
  }
};

const quantity = (object) => Object.entries(object).find(([name]) => name.endsWith("Value"))?.[1];
const set = (id) => {
  const object = line(id);
  if (object.type !== IFCPROPERTYSET && object.type !== IFCELEMENTQUANTITY) return;
  answer.sets += 1;
  text(object.Name);
  const isSet = object.type === IFCPROPERTYSET;
  for (const reference of isSet ? object.HasProperties : object.Quantities) {
    const part = line(reference.value);
    answer[isSet ? "properties" : "quantities"] += 1;
    text(part.Name);
    const value = isSet ? part.NominalValue : quantity(part);
    if (typeof value?.value === "number") answer.sumOfValues += value.value;
    else text(value);
  }
};

for (const id of ids(IFCMEMBER)) {
  const member = line(id);
  answer.members += 1;
  text(member.Name);
  if (member.Representation) for (const shape of line(member.Representation.value).Representations) items(line(shape.value));
  for (const definition of setsOf.get(id) ?? []) set(definition);
  if (typeOf.has(id)) for (const definition of line(typeOf.get(id)).HasPropertySets ?? []) set(definition.value);
}

// Ten digits, and exponents of three digits as .NET writes them.
const short = (value) => {
  const [digits, exponent] = value.toExponential(9).toUpperCase().split("E");
  return `${digits}E${exponent[0]}${exponent.slice(1).padStart(3, "0")}`;
};
process.stdout.write(`members ${answer.members} dimensions ${answer.dimensions} ${short(answer.sumOfDimensions)} sets ${answer.sets} properties ${answer.properties} quantities ${answer.quantities} values ${short(answer.sumOfValues)} characters ${answer.characters}\n`);
