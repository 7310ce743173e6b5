# Targets: beamcore::shared and beamcore::static; beamcore::beamcore is the shared one.
# This file stands in LIBDIR/cmake/beamcore, so that an installed tree can be moved.
get_filename_component(_beamcore_lib "${CMAKE_CURRENT_LIST_DIR}/../.." ABSOLUTE)
# LIBDIR is PREFIX/lib or PREFIX/lib64, or on some systems one folder deeper.
find_path(BEAMCORE_INCLUDE_DIR beamcore.h
    PATHS "${_beamcore_lib}/../include" "${_beamcore_lib}/../../include" NO_DEFAULT_PATH)
find_package(Threads REQUIRED)

if(NOT TARGET beamcore::shared)
    add_library(beamcore::shared SHARED IMPORTED)
    set_target_properties(beamcore::shared PROPERTIES
        IMPORTED_LOCATION "${_beamcore_lib}/libbeamcore.so"
        INTERFACE_INCLUDE_DIRECTORIES "${BEAMCORE_INCLUDE_DIR}")

    add_library(beamcore::static STATIC IMPORTED)
    set_target_properties(beamcore::static PROPERTIES
        IMPORTED_LOCATION "${_beamcore_lib}/libbeamcore.a"
        INTERFACE_INCLUDE_DIRECTORIES "${BEAMCORE_INCLUDE_DIR}"
        INTERFACE_LINK_LIBRARIES "gcc_s;util;rt;Threads::Threads;m;dl")

    add_library(beamcore::beamcore INTERFACE IMPORTED)
    set_target_properties(beamcore::beamcore PROPERTIES
        INTERFACE_LINK_LIBRARIES beamcore::shared)
endif()
