# Sourced by the scripts beside it: goes to the top of the project and sees to the tools they need.
# On Debian and as root it installs what is missing; elsewhere it says what to install.

set -euo pipefail
cd "$(dirname "${BASH_SOURCE[0]}")/.."

# need COMMAND PACKAGE: the command is there, or its Debian package gets installed.
need() {
  command -v "$1" >/dev/null && return
  if [ "$(id -u)" != 0 ] || ! command -v apt-get >/dev/null; then
    echo "$1 is missing: install it (Debian's package: $2) and run this again." >&2
    exit 1
  fi
  if [ -z "${package_lists_read:-}" ]; then
    apt-get -qq update
    package_lists_read=yes
  fi
  DEBIAN_FRONTEND=noninteractive apt-get -qq -y --no-install-recommends install "$2" >/dev/null
}

need_java() {
  need javac default-jdk-headless
  need mvn maven
}

need_node() {
  need node nodejs
  need npm npm
  if ! node -e 'const [a, b] = process.versions.node.split("."); process.exit(a > 20 || (a == 20 && b >= 19) ? 0 : 1)'; then
    echo "Node.js $(node --version) is too old for the checks of the pages: install 20.19 or newer." >&2
    exit 1
  fi
}
