#!/bin/sh
# Measures the recalculation of a sheet after one input changed. Arguments go to JMH:
#   kernel/bench/sheet.sh            three forks of each benchmark, about two minutes
#   kernel/bench/sheet.sh -f 1 -i 5  a quick look
set -eu
cd "$(dirname "$0")/../.."
mvn -B -q -Dquick -pl units,kernel -am test-compile dependency:build-classpath \
  -Dmdep.includeScope=test -Dmdep.outputFile=target/test-classpath.txt
exec java -cp "kernel/target/classes:kernel/target/test-classes:$(cat kernel/target/test-classpath.txt)" \
  org.openjdk.jmh.Main 'whorl\.sheet\.SheetBenchmark' "$@"
