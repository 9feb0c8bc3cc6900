// A sample that the check must refuse; nothing compiles it.
#include "../limits/limit_set.h"
