# Sourced by the scripts beside it: the folders, the Maven that Tycho needs, and what a window needs.
root=$(cd "$(dirname "$0")/.." && pwd)
cache=${GAPWRIGHT_CACHE:-$root/.cache}
maven_version=3.9.16

say() { printf 'gapwright: %s\n' "$*" >&2; }
die() { say "$*"; exit 70; }

java_tool() {
	if [ -n "$JAVA_HOME" ] && [ -x "$JAVA_HOME/bin/$1" ]; then echo "$JAVA_HOME/bin/$1"; else command -v "$1"; fi
}

need_jdk() {
	java=$(java_tool java) && javac=$(java_tool javac) || die "a JDK 17 is needed (Debian, Ubuntu: apt-get install openjdk-17-jdk-headless)"
	release=$("$javac" -version 2>&1 | sed -n 's/^javac \([0-9]*\).*/\1/p')
	[ "${release:-0}" -ge 17 ] || die "a JDK 17 or later is needed; $javac is $("$javac" -version 2>&1)"
}

# Tycho 4 needs Maven 3.9. Any Maven can fetch it, but not from inside this folder, where it would load Tycho first.
need_maven() {
	maven=$cache/apache-maven-$maven_version/bin/mvn
	[ -x "$maven" ] && return
	command -v mvn >/dev/null || die "Maven is needed, any version (Debian, Ubuntu: apt-get install maven)"
	say "fetching Maven $maven_version into $cache"
	mkdir -p "$cache"
	elsewhere=$(mktemp -d)
	(cd "$elsewhere" && mvn -q -B -Dstyle.color=never dependency:unpack -Dartifact=org.apache.maven:apache-maven:$maven_version:zip:bin \
		-DoutputDirectory="$elsewhere") || die "Maven $maven_version could not be fetched"
	rm -rf "$cache/apache-maven-$maven_version"
	mv "$elsewhere/apache-maven-$maven_version" "$cache/" && rm -rf "$elsewhere"
	chmod +x "$maven"
}

# need_packages PACKAGE…: by the system's package manager when root, else a message that names them
need_packages() {
	[ $# -gt 0 ] || return 0
	command -v apt-get >/dev/null || die "these Debian packages, or what is like them here, are needed: $*"
	[ "$(id -u)" = 0 ] || die "packages are missing; as root: apt-get install $*"
	say "installing $*"
	export DEBIAN_FRONTEND=noninteractive
	apt-get install -y -qq --no-install-recommends "$@" >/dev/null 2>&1 && return
	{ apt-get update -qq && apt-get install -y -qq --no-install-recommends "$@"; } >&2 || die "could not install $*"
}

gtk_package() { ldconfig -p | grep -q 'libgtk-3\.so\.0' || echo libgtk-3-0; }
font_package() { [ -d /usr/share/fonts/truetype/dejavu ] || echo fonts-dejavu-core; }
package_of() { command -v "$1" >/dev/null || echo "$2"; }

has_display() {
	case ${DISPLAY-} in
	"") return 1 ;;
	:*) number=${DISPLAY#:}; [ -S "/tmp/.X11-unix/X${number%%.*}" ] ;;
	esac
}

# A virtual display with a small window manager, gone when the script ends.
virtual_display() {
	shown=$(mktemp)
	Xvfb -displayfd 1 -screen 0 1600x1000x24 -nolisten tcp >"$shown" 2>/dev/null &
	display_jobs=$!
	trap 'kill $display_jobs 2>/dev/null' EXIT
	trap 'exit 130' INT TERM
	tries=0
	until [ -s "$shown" ]; do
		tries=$((tries + 1))
		[ $tries -le 100 ] || die "the virtual display did not start"
		sleep 0.1
	done
	DISPLAY=:$(cat "$shown") && export DISPLAY && rm -f "$shown"
	openbox >/dev/null 2>&1 &
	display_jobs="$display_jobs $!"
}

product=$root/releng/gapwright.product/target/products/gapwright/linux/gtk/x86_64

# What the product is made of, as a number that changes when a file comes, goes or changes.
product_inputs() {
	(cd "$root" && find pom.xml .mvn bundles features releng/gapwright.target releng/gapwright.product \( -name target -o -name bin \) -prune \
		-o -type f ! -name '.polyglot*' ! -name '.tycho*' -printf '%p %s %T@\n' | sort | cksum)
}
product_is_current() { [ -d "$product" ] && [ "$(product_inputs)" = "$(cat "$cache/product.state" 2>/dev/null)" ]; }
