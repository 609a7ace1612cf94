#!/bin/sh
# Reads a mesh of a million triangles from binary STL into mass, centre and inertia, and beside it only
# the bytes of the file. The first round is that of a fresh process, as in a note.
#   kernel/bench/mesh.sh       five rounds, a few seconds
#   kernel/bench/mesh.sh 20    as many as said
set -eu
cd "$(dirname "$0")/../.."
mvn -B -q -Dquick -pl units,kernel -am test-compile dependency:build-classpath \
  -Dmdep.includeScope=test -Dmdep.outputFile=target/test-classpath.txt
exec java -cp "kernel/target/classes:kernel/target/test-classes:$(cat kernel/target/test-classpath.txt)" \
  whorl.mechanics.body.mesh.MeshBenchmark "$@"
