# Shared by run and test: finds a JDK and Maven, then builds. What is said here goes to standard error; standard output
# belongs to the product and to the test's last line. Sourced with `top` set to the checkout.

MAVEN_VERSION=3.9.16
JAVA_NEEDED=21
tools=$top/.tools
product=$top/releng/product/target/products/stirwright.product/linux/gtk/x86_64

say() { printf '%s\n' "$*" >&2; }

die() {
  say "stirwright: $*"
  exit 3
}

packages_listed=

# list_packages: asks the network once in a run, whether it answers or not.
list_packages() {
  [ -n "$packages_listed" ] || { apt-get update >&2 && packages_listed=yes || packages_listed=no; }
  [ "$packages_listed" = yes ]
}

# install PACKAGE...: the first that this Debian release has; fails when there is none or no right to install.
install() {
  local package
  [ "$(id -u)" = 0 ] && command -v apt-get >/dev/null || return 1
  list_packages || return 1
  for package; do
    apt-cache show "$package" >/dev/null 2>&1 || continue
    say "installing $package"
    DEBIAN_FRONTEND=noninteractive apt-get install -y --no-install-recommends "$package" >&2 && return
  done
  return 1
}

# jdk HOME: takes HOME as JAVA_HOME when it holds a compiler that is new enough.
jdk() {
  local version
  [ -x "$1/bin/javac" ] || return 1
  version=$("$1/bin/javac" -version 2>&1 | sed -n 's/^javac \([0-9]*\).*/\1/p')
  [ "${version:-0}" -ge "$JAVA_NEEDED" ] && export JAVA_HOME=$1
}

look_for_jdk() {
  local home
  [ -n "${JAVA_HOME:-}" ] && jdk "$JAVA_HOME" && return
  command -v javac >/dev/null && home=$(readlink -f "$(command -v javac)") && jdk "${home%/bin/javac}" && return
  for home in /usr/lib/jvm/* /Library/Java/JavaVirtualMachines/*/Contents/Home; do
    jdk "$home" && return
  done
  return 1
}

find_jdk() {
  look_for_jdk && return
  install openjdk-25-jdk-headless openjdk-21-jdk-headless && look_for_jdk && return
  die "needs a JDK $JAVA_NEEDED or later (on Debian openjdk-25-jdk-headless or openjdk-21-jdk-headless, where the" \
    "release has one): install one or set JAVA_HOME."
}

# The machine's Maven may be too old for the build, so it only fetches the one that the build uses.
find_maven() {
  local fetched=$tools/fetched.$$
  mvn=$tools/apache-maven-$MAVEN_VERSION/bin/mvn
  [ -x "$mvn" ] && return
  command -v mvn >/dev/null || install maven || die "needs Maven (on Debian the package maven) to fetch the Maven that it builds with."
  say "fetching Maven $MAVEN_VERSION"
  (cd "$tools" && mvn -B -q org.apache.maven.plugins:maven-dependency-plugin:3.7.1:unpack \
    "-Dartifact=org.apache.maven:apache-maven:$MAVEN_VERSION:zip:bin" "-DoutputDirectory=$fetched" \
    "-Dproject.basedir=$fetched") >&2 \
    && mv "$fetched/apache-maven-$MAVEN_VERSION" "$tools/" || die "could not fetch Maven $MAVEN_VERSION; is there a network?"
  rm -rf "$fetched"
}

# start_display: a screen in memory for the tests of the window, on a free number; ends with the shell. It holds a window of
# 1280x800 at 200 %, and does not reset itself when a test closes its window, which would turn away the next one.
start_display() {
  local number=$tools/display.$$ waited=0
  command -v Xvfb >/dev/null || install xvfb || die "the window's tests need Xvfb (on Debian the package xvfb)."
  has_library libgtk-3.so.0 || install libgtk-3-0t64 libgtk-3-0 || die "the window's tests need GTK 3 (on Debian libgtk-3-0)."
  has_font || install fonts-dejavu-core || die "the window's tests need a font (on Debian fonts-dejavu-core)."
  Xvfb -displayfd 7 -noreset -screen 0 2800x1800x24 -nolisten tcp 7>"$number" 8>&- 9>&- 2>"$tools/display.log" >&2 &
  display=$!
  trap stop_display EXIT
  while [ ! -s "$number" ]; do
    kill -0 "$display" 2>/dev/null && [ $((waited += 1)) -le 100 ] \
      || die "Xvfb did not start; see $tools/display.log. The window's tests cannot run without it."
    sleep 0.1
  done
  export DISPLAY=:$(cat "$number") GDK_BACKEND=x11 NO_AT_BRIDGE=1
  unset WAYLAND_DISPLAY GDK_SCALE
}

# find_browsers: what shows the cards, in the window and beside it. Their tests skip and say so where it cannot be had.
find_browsers() {
  has_library libwebkit2gtk-4.1.so.0 || has_library libwebkit2gtk-4.0.so.37 || install libwebkit2gtk-4.1-0 \
    || say "without WebKitGTK (on Debian libwebkit2gtk-4.1-0) the tests of the cards in the window skip."
  command -v chromium chromium-browser google-chrome >/dev/null || install chromium \
    || say "without Chromium (on Debian chromium) the test of the cards in a browser skips."
}

stop_display() {
  kill "$display" 2>/dev/null || true
  rm -f "$tools/display.$$"
}

has_library() { PATH=$PATH:/sbin:/usr/sbin ldconfig -p 2>/dev/null | grep -F "$1" >/dev/null; }

has_font() { find /usr/share/fonts /usr/local/share/fonts -name '*.[to]tf' 2>/dev/null | grep . >/dev/null; }

# One build at a time in a checkout. Ends by itself with the shell, or by `unlock`.
lock() {
  mkdir -p "$tools"
  exec 9>"$tools/lock"
  ! command -v flock >/dev/null || flock 9
}

unlock() { exec 9>&-; }

# hash_sources FIND-EXPRESSION...: one hash over the names and contents of the source files that match.
hash_sources() {
  (cd "$top" && find pom.xml LICENSE .mvn bundles features releng \
    \( -path 'bundles/*/target' -o -path 'bundles/*/src-gen' -o -path 'features/*/target' -o -path 'releng/*/target' \) -prune -o -type f "$@" -print0 \
    | LC_ALL=C sort -z | xargs -0 sha256sum | sha256sum | cut -d' ' -f1)
}

# What the product is made of: the same whichever script builds it.
hash_product() { hash_sources -not -path '*.tests/*'; }

# built HASH: notes what the product was built from. The note is cleaned away with the product.
built() { printf '%s\n' "$1" >"$top/releng/product/target/built-from"; }

up_to_date() { [ -x "$product/stirwright" ] && [ "$(cat "$top/releng/product/target/built-from" 2>/dev/null)" = "$1" ]; }

# maven PURPOSE ARGUMENT...: builds for PURPOSE (run or test); the log goes to .tools/PURPOSE.log and to descriptor 8.
# Once this or a test got through with the same poms and target, everything is there and the network is left alone;
# should something be missing all the same, it is fetched.
maven() {
  local log=$tools/$1.log stamp result
  stamp=$tools/fetched-$(hash_sources \( -name pom.xml -o -name '*.target' -o -path '.mvn/*' \))
  if [ -e "$stamp-$1" ] || [ -e "$stamp-test" ]; then
    call_maven "$log" -o "${@:2}" && return
    grep -qE 'in offline mode|has not been downloaded' "$log" || return 1
    say "something is missing: building again with the network"
    rm -f "$stamp"-*
  fi
  call_maven "$log" "${@:2}" && result=0 || result=1
  if [ $result = 0 ] || only_tests_failed "$log"; then
    touch "$stamp-$1"
  fi
  return $result
}

call_maven() { (cd "$top" && "$mvn" "${@:2}") 2>&1 | tee "$1" >&8; }

only_tests_failed() {
  grep -q 'There are test failures' "$1" && ! grep 'Failed to execute goal' "$1" | grep -qv 'There are test failures'
}
