# Writes OUTPUT, a C++ file that holds each of TABLES (a ;-list of files) as bytes.
set(entries "")
set(arrays "")
set(count 0)
foreach(table ${TABLES})
  get_filename_component(stem ${table} NAME_WE)
  file(READ ${table} hex HEX)
  string(REGEX REPLACE "([0-9a-f][0-9a-f])" "0x\\1," bytes "${hex}")
  math(EXPR count "${count} + 1")
  string(APPEND arrays "constexpr unsigned char table_${count}[] = {${bytes}};\n")
  string(APPEND entries "    {\"${stem}.toml\", {reinterpret_cast<const char*>(table_${count}), sizeof table_${count}}},\n")
endforeach()
file(WRITE ${OUTPUT} "#include \"limits/embedded_tables.h\"\n\nnamespace dosimetry {\nnamespace {\n${arrays}}  // namespace\n
std::vector<EmbeddedTable> embedded_tables() {\n  return {\n${entries}  };\n}\n}  // namespace dosimetry\n")
