# Opens JupyterLab in a Python environment of its own, with the kernel in it. Part of the launcher,
# which reads it with `.`: fail, take_lock, root, jar, home, version and build_of_jdk are there.
# shellcheck shell=sh disable=SC2154

wanted='jupyterlab>=4.2,<5 jupyter_server>=2.14,<3 jupyter_client>=8.6,<9'

# ---- Where the environment is. ----

lab=${WHORL_LAB:-}
if [ -z "$lab" ]; then
  [ -n "${HOME:-}" ] || fail 'HOME is not set; WHORL_LAB may name a folder for JupyterLab'
  if [ "$(uname)" = Darwin ]; then
    lab=$HOME/Library/Caches/whorl/lab
  else
    lab=${XDG_CACHE_HOME:-$HOME/.cache}/whorl/lab
  fi
fi
case $lab in
  /*) ;;
  *) lab=$PWD/$lab ;;
esac

# Marks a folder as ours. It says what was installed, or nothing while that goes on, so that a
# half-made environment is made again.
mark=$lab/made-by-whorl
# Says for which JDK the kernel was installed.
kernel_mark=$lab/kernel-installed-by-whorl

# ---- What was to be opened. ----

case ${1:-} in
  '' | -*) set -- "$root/notebooks-demo" "$@" ;;
  *) [ -e "$1" ] || fail "there is no file $1" ;;
esac

# ---- The environment: made on first use, and when something else is wanted. ----

# After an upgrade of Python its environments find nothing.
has_lab() {
  [ "$(cat "$mark" 2>/dev/null)" = "$wanted" ] && "$lab/bin/python" -c '
import importlib.util, sys
sys.exit(importlib.util.find_spec("jupyterlab") is None)' 2>/dev/null
}

make_lab() {
  python=${WHORL_PYTHON:-python3}
  python_need='Python 3.9 or newer is needed for JupyterLab'
  command -v "$python" >/dev/null ||
    fail "$python_need, and there is no $python on the PATH; WHORL_PYTHON may name one"
  "$python" -c 'import sys; sys.exit(sys.version_info < (3, 9))' 2>/dev/null ||
    fail "$python_need, but $python is $("$python" -V 2>&1); WHORL_PYTHON may name another"
  "$python" -c 'import venv, ensurepip' 2>/dev/null ||
    fail "$python cannot make Python environments; on Debian and Ubuntu, install python3-venv"

  printf 'whorl: installing JupyterLab in %s; this takes a minute or two …\n' "$lab" >&2
  log=$(mktemp "${TMPDIR:-/tmp}/whorl-lab.XXXXXX") || fail 'there is no place for a log'
  rm -rf "$lab" && mkdir -p "$lab" && : >"$mark" || fail "there is no permission to write $lab"
  "$python" -m venv "$lab" >"$log" 2>&1 || fail_with_log 'no Python environment could be made'
  # shellcheck disable=SC2086 # the requirements are words
  "$lab/bin/python" -m pip install --disable-pip-version-check --no-input $wanted \
    >"$log" 2>&1 </dev/null ||
    fail_with_log 'JupyterLab could not be installed; a first start needs a network'
  write_settings
  rm -f "$log"
  printf '%s\n' "$wanted" >"$mark"
}

fail_with_log() {
  tail -n 5 "$log" >&2
  fail "$1; all that was said is in $log"
}

# A new notebook is ours, and nobody is asked whether to fetch news.
write_settings() {
  mkdir -p "$lab/share/jupyter/lab/settings" "$lab/etc/jupyter"
  cat >"$lab/share/jupyter/lab/settings/overrides.json" <<'JSON'
{
  "@jupyterlab/apputils-extension:notification": {
    "checkForUpdates": false,
    "fetchNews": "false"
  }
}
JSON
  cat >"$lab/etc/jupyter/jupyter_server_config.json" <<'JSON'
{"MultiKernelManager": {"default_kernel_name": "whorl"}}
JSON
}

# ---- The kernel: installed again when the program or the JDK is another. ----

has_kernel() {
  [ "$(cat "$kernel_mark" 2>/dev/null)" = "$home $version$build_of_jdk" ] &&
    [ -z "$(find "$jar" -newer "$kernel_mark")" ]
}

if ! has_lab || ! has_kernel; then
  if [ -e "$lab" ] && [ ! -f "$mark" ] && [ -n "$(ls -A "$lab" 2>/dev/null)" ]; then
    fail "$lab holds something else; WHORL_LAB must name a folder that is empty or not there yet"
  fi
  take_lock "$lab.lock"
  has_lab || make_lab
  if ! has_kernel; then
    "$root/kernel/bin/whorl" install --prefix "$lab" >/dev/null || exit
    printf '%s\n' "$home $version$build_of_jdk" >"$kernel_mark"
  fi
  give_lock
fi

# The user's own kernels and settings stay in sight, behind those of the environment.
export JUPYTER_PREFER_ENV_PATH=1
exec "$lab/bin/python" "$lab/bin/jupyter-lab" "$@"
