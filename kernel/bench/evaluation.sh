#!/bin/sh
# Measures block evaluation against a loop written by hand. Arguments go to JMH:
#   kernel/bench/evaluation.sh            three forks of each benchmark, about two and a half minutes
#   kernel/bench/evaluation.sh -f 1 -i 5  a quick look
set -eu
cd "$(dirname "$0")/../.."
mvn -B -q -Dquick -pl units,kernel -am test-compile dependency:build-classpath \
  -Dmdep.includeScope=test -Dmdep.outputFile=target/test-classpath.txt
exec java -cp "kernel/target/classes:kernel/target/test-classes:$(cat kernel/target/test-classpath.txt)" \
  org.openjdk.jmh.Main 'whorl\.eval\.EvaluationBenchmark' "$@"
