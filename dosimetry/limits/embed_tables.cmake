# Writes OUTPUT, a C++ file that holds each of TABLES (a ;-list of files) as bytes.
set(entries "")
set(arrays "")
foreach(table ${TABLES})
  get_filename_component(stem ${table} NAME_WE)
  file(READ ${table} hex HEX)
  string(REGEX REPLACE "([0-9a-f][0-9a-f])" "0x\\1," bytes "${hex}")
  string(APPEND arrays "constexpr unsigned char ${stem}[] = {${bytes}};\n")
  string(APPEND entries "    {\"${stem}.toml\", {reinterpret_cast<const char*>(${stem}), sizeof ${stem}}},\n")
endforeach()
file(WRITE ${OUTPUT} "#include \"limits/embedded_tables.h\"\n\nnamespace dosimetry {\nnamespace {\n${arrays}}  // namespace\n
std::vector<EmbeddedTable> embedded_tables() {\n  return {\n${entries}  };\n}\n}  // namespace dosimetry\n")
