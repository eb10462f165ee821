// Reads an IFC2X3 or IFC4 file with the library IfcPlusPlus alone and prints what it found, a line each, fields parted by tabs:
//   I  number  instance as the library would write it
//   P  GlobalId of the element  set  property  type  value
//   U  type  unit as the library would write it
// Usage: read-sets FILE. Exit codes: 0 read, 1 the library could not read it, 64 wrong usage.
#include <clocale>
#include <codecvt>
#include <fstream>
#include <iostream>
#include <locale>
#include <memory>
#include <sstream>
#include <string>

#include <ifcpp/model/BasicTypes.h>
#include <ifcpp/model/BuildingModel.h>
#include <ifcpp/model/BuildingObject.h>
#include <ifcpp/reader/ReaderSTEP.h>

#include <ifcpp/IFC4/include/IfcGloballyUniqueId.h>
#include <ifcpp/IFC4/include/IfcIdentifier.h>
#include <ifcpp/IFC4/include/IfcInteger.h>
#include <ifcpp/IFC4/include/IfcLabel.h>
#include <ifcpp/IFC4/include/IfcLengthMeasure.h>
#include <ifcpp/IFC4/include/IfcObjectDefinition.h>
#include <ifcpp/IFC4/include/IfcPressureMeasure.h>
#include <ifcpp/IFC4/include/IfcProject.h>
#include <ifcpp/IFC4/include/IfcProperty.h>
#include <ifcpp/IFC4/include/IfcPropertySet.h>
#include <ifcpp/IFC4/include/IfcPropertySingleValue.h>
#include <ifcpp/IFC4/include/IfcRatioMeasure.h>
#include <ifcpp/IFC4/include/IfcRelDefinesByProperties.h>
#include <ifcpp/IFC4/include/IfcText.h>
#include <ifcpp/IFC4/include/IfcUnit.h>
#include <ifcpp/IFC4/include/IfcUnitAssignment.h>
#include <ifcpp/IFC4/include/IfcValue.h>

namespace {

std::string utf8(const std::wstring& text) {
  std::wstring_convert<std::codecvt_utf8<wchar_t>> converter;
  std::string bytes = converter.to_bytes(text);
  for (char& c : bytes)
    if (c == '\t' || c == '\n' || c == '\r') c = ' ';
  return bytes;
}

std::string line_of(const BuildingEntity& entity) {
  std::stringstream stream;
  stream.imbue(std::locale::classic());
  stream.precision(17);
  entity.getStepLine(stream);
  std::string text = stream.str();
  for (char& c : text)
    if (c == '\t' || c == '\n' || c == '\r') c = ' ';
  return text;
}

template <class T>
bool number(const std::shared_ptr<IfcValue>& value, std::string& text) {
  const auto measure = std::dynamic_pointer_cast<T>(value);
  if (!measure) return false;
  std::stringstream stream;
  stream.imbue(std::locale::classic());
  stream.precision(17);
  stream << measure->m_value;
  text = stream.str();
  return true;
}

template <class T>
bool words(const std::shared_ptr<IfcValue>& value, std::string& text) {
  const auto label = std::dynamic_pointer_cast<T>(value);
  if (!label) return false;
  text = utf8(label->m_value);
  return true;
}

void print_set(const std::string& element, const IfcPropertySet& set) {
  for (const auto& property : set.m_HasProperties) {
    const auto single = std::dynamic_pointer_cast<IfcPropertySingleValue>(property);
    if (!single || !single->m_NominalValue) continue;

    std::string text;
    const auto& value = single->m_NominalValue;
    const bool known = number<IfcRatioMeasure>(value, text) || number<IfcPressureMeasure>(value, text) || number<IfcLengthMeasure>(value, text) || number<IfcInteger>(value, text)
                    || words<IfcLabel>(value, text) || words<IfcText>(value, text) || words<IfcIdentifier>(value, text);
    std::cout << "P\t" << element << '\t' << utf8(set.m_Name ? set.m_Name->m_value : L"") << '\t' << utf8(single->m_Name ? single->m_Name->m_value : L"") << '\t'
              << value->className() << '\t' << (known ? text : utf8(value->toString())) << '\n';
  }
}

}  // namespace

int main(int count, char** arguments) {
  if (count != 2) {
    std::cerr << "Usage: read-sets FILE\n";
    return 64;
  }

  auto model = std::make_shared<BuildingModel>();
  try {
    // From a text: reading by path gives an empty model where the file is not in the library's own encoding of names.
    std::ifstream file(arguments[1], std::ios::binary);
    std::stringstream bytes;
    bytes << file.rdbuf();
    std::string text = bytes.str();
    ReaderSTEP().loadModelFromString(text, model);
  } catch (const std::exception& fault) {
    std::cerr << "The file could not be read: " << fault.what() << '\n';
    return 1;
  }

  // The reader leaves another locale behind, which would part thousands in what follows.
  std::setlocale(LC_ALL, "C");
  std::locale::global(std::locale::classic());
  if (model->getMapIfcEntities().empty() || !model->getIfcProject()) {
    std::cerr << "The library found no project in the file\n";
    return 1;
  }

  for (const auto& entry : model->getMapIfcEntities()) {
    std::cout << "I\t" << entry.first << '\t' << line_of(*entry.second) << '\n';
    const auto relation = std::dynamic_pointer_cast<IfcRelDefinesByProperties>(entry.second);
    const auto set = relation ? std::dynamic_pointer_cast<IfcPropertySet>(relation->m_RelatingPropertyDefinition) : nullptr;
    if (!set) continue;

    for (const auto& object : relation->m_RelatedObjects)
      if (object && object->m_GlobalId) print_set(utf8(object->m_GlobalId->m_value), *set);
  }

  const auto project = model->getIfcProject();
  if (project->m_UnitsInContext)
    for (const auto& unit : project->m_UnitsInContext->m_Units)
      if (const auto entity = std::dynamic_pointer_cast<BuildingEntity>(unit)) std::cout << "U\t" << entity->className() << '\t' << line_of(*entity) << '\n';
  return 0;
}
