// A small job in TOML, in pieces that tests can replace.
#ifndef JOBS_H
#define JOBS_H

#define JOB_HEAD "version = 1\nmark = \"T1\"\ntitle = \"A joist\"\n"
#define JOB_MATERIAL "[materials.C24]\ntimber = \"C24\"\nservice_class = 1\n"
#define JOB_PART                                                                                   \
    "[[section.parts]]\nname = \"joist\"\nmaterial = \"C24\"\n"                                    \
    "outline = { rectangle = { width = \"100 mm\", height = \"200 mm\" } }\n"                      \
    "place = { at = { y = \"0 mm\", z = \"0 mm\" } }\n"
#define JOB_MEMBER                                                                                 \
    "[member]\nlength = \"4 m\"\nsupports = [\n"                                                   \
    "    { name = \"left\", kind = \"pin\", at = \"0 m\" },\n"                                     \
    "    { name = \"right\", kind = \"roller\", at = \"4 m\" },\n]\n"
#define JOB_ACTION(load)                                                                           \
    "[[actions]]\nname = \"floor\"\nkind = \"permanent\"\n"                                        \
    "loads = [{ uniform = { load = \"" load "\" } }]\n"

#define JOB JOB_HEAD JOB_MATERIAL JOB_PART JOB_MEMBER JOB_ACTION("2 kN/m")

#endif
