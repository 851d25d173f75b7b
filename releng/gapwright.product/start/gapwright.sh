#!/bin/sh
# Starts Gapwright on Linux or macOS with a Java 17 or later. Arguments go to the workbench.
here=$(cd "$(dirname "$0")" && pwd)
[ -d "$here/plugins" ] || here=$here/Eclipse.app/Contents/Eclipse
[ "$(uname)" = Darwin ] && first_thread=-XstartOnFirstThread
exec "${JAVA_HOME:+$JAVA_HOME/bin/}java" -Xms64m -Xmx2g $first_thread -jar "$here"/plugins/org.eclipse.equinox.launcher_*.jar -nosplash "$@"
