#!/bin/sh
# Builds the shared and the static library and installs them with headers, pkg-config and CMake
# files: install.sh PREFIX [LIBDIR], LIBDIR being lib (the default), lib64 or the like.
set -eu
prefix=${1:?usage: install.sh PREFIX [LIBDIR]}
mkdir -p "$prefix"
prefix=$(cd "$prefix" && pwd)
libdir=$prefix/${2:-lib}
cd "$(dirname "$0")"

version=$(cargo pkgid | sed 's/.*[#@]//')
# What may be exchanged without notice: 0.1 before version 1, later 1.
case $version in
    0.*) series=$(echo "$version" | cut -d. -f1,2) ;;
    *) series=$(echo "$version" | cut -d. -f1) ;;
esac
abi=$(sed -n 's/^#define BC_ABI_VERSION //p' include/beamcore.h)

built=$(cargo rustc --release --crate-type cdylib --message-format=json -- \
    -C "link-arg=-Wl,-soname,libbeamcore.so.$abi" -C strip=debuginfo |
    sed -n 's/.*"filenames":\["\([^"]*libbeamcore_ffi\.so\)".*/\1/p')
archive=$(cargo rustc --release --crate-type staticlib --message-format=json |
    sed -n 's/.*"filenames":\["\([^"]*libbeamcore_ffi\.a\)".*/\1/p')

mkdir -p "$prefix/include/beamcore" "$libdir/pkgconfig" "$libdir/cmake/beamcore"
cp include/beamcore.h include/beamcore.hpp include/beamcore_units.hpp "$prefix/include/"
cp include/beamcore/*.hpp "$prefix/include/beamcore/"
cp "$built" "$libdir/libbeamcore.so.$version"
ln -sf "libbeamcore.so.$version" "$libdir/libbeamcore.so.$abi"
ln -sf "libbeamcore.so.$abi" "$libdir/libbeamcore.so"
cp "$archive" "$libdir/libbeamcore.a"
# From the folder of the .pc file up to the prefix: one step for itself, one for each of LIBDIR.
up=$(echo "${2:-lib}" | sed 's|[^/][^/]*|..|g')
sed -e "s/@VERSION@/$version/" -e "s|@UP@|$up|" -e "s|@LIBDIR@|${2:-lib}|" \
    pkgconfig/beamcore.pc.in >"$libdir/pkgconfig/beamcore.pc"
cp cmake/beamcore-config.cmake "$libdir/cmake/beamcore/"
sed -e "s/@VERSION@/$version/" -e "s/@SERIES@/$series/" \
    cmake/beamcore-config-version.cmake.in \
    >"$libdir/cmake/beamcore/beamcore-config-version.cmake"
