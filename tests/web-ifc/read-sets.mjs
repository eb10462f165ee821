// Prints the property sets of every element of an IFC file as JSON, read by web-ifc alone:
// { schema, lines, elements: { GlobalId: { keyword, name, sets: { set: { property: { value, type } } } } } }
// Usage: node read-sets.mjs FILE
import { readFileSync } from "node:fs";
import { IFCELEMENT, IFCRELDEFINESBYPROPERTIES, IFCPROPERTYSET, IFCPROPERTYSINGLEVALUE, IfcAPI, LogLevel } from "web-ifc";

const path = process.argv[2];
if (path === undefined) {
  process.stderr.write("Usage: node read-sets.mjs FILE\n");
  process.exit(64);
}

let bytes;
try {
  bytes = readFileSync(path);
} catch (error) {
  process.stderr.write(`The file could not be read: ${error.code}\n`);
  process.exit(74);
}

const api = new IfcAPI();
await api.Init();
api.SetLogLevel(LogLevel.LOG_LEVEL_ERROR);
const model = api.OpenModel(bytes);
if (model < 0) {
  process.stderr.write("web-ifc could not open the file\n");
  process.exit(1);
}

const ids = (vector) => Array.from({ length: vector.size() }, (_, i) => vector.get(i));
const line = (id) => api.GetLine(model, id);
const plain = (value) => value?.value ?? null;

const elements = {};
const element = (id) => {
  const object = line(id);
  return (elements[plain(object.GlobalId)] ??= {
    keyword: api.GetNameFromTypeCode(object.type),
    name: plain(object.Name),
    sets: {},
  });
};

for (const id of ids(api.GetLineIDsWithType(model, IFCELEMENT, true))) element(id);

for (const id of ids(api.GetLineIDsWithType(model, IFCRELDEFINESBYPROPERTIES))) {
  const relation = line(id);
  const definitions = [relation.RelatingPropertyDefinition].flat(2);
  for (const definition of definitions) {
    const set = line(definition.value);
    if (set.type !== IFCPROPERTYSET) continue;

    const properties = {};
    for (const reference of set.HasProperties) {
      const property = line(reference.value);
      properties[plain(property.Name)] = property.type === IFCPROPERTYSINGLEVALUE
        ? { value: plain(property.NominalValue), type: property.NominalValue?.name ?? null }
        : { value: null, type: api.GetNameFromTypeCode(property.type) };
    }

    for (const object of relation.RelatedObjects) {
      const sets = element(object.value).sets;
      const name = plain(set.Name);
      // Two sets of one name on one object are an error of the file: both are shown, the later under a numbered name.
      let key = name;
      for (let number = 2; key in sets; number++) key = `${name} (${number})`;
      sets[key] = properties;
    }
  }
}

const result = { schema: api.GetModelSchema(model), lines: api.GetAllLines(model).size(), elements };
process.stdout.write(JSON.stringify(result, null, 2) + "\n");
api.CloseModel(model);
