// A sample that the check must refuse; nothing compiles it.
#include <QString>
