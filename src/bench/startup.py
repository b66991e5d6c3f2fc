#!/usr/bin/env python3
"""Measures how long gnomon takes to start, as a ratio to a bare `java Hello` of the same JDK.

    python3 src/bench/startup.py [ROUNDS]

Build the image first (mvn package). The bare program is compiled and run on the JDK that the image was
made with. The console is started on a pseudo-terminal and timed until its prompt stands; `gnomon run`
is timed on a file of one line until it ends. The three are measured in turn, round by round, so that
a change of the machine's speed touches all of them; the figures are medians.
"""

import os
import pty
import select
import statistics
import subprocess
import sys
import tempfile
import time
from pathlib import Path

IMAGE = Path(__file__).resolve().parents[2] / "target" / "gnomon"
HELLO = "public class Hello { public static void main(String[] a) { System.out.println(\"hello\"); } }\n"
PROMPTS = ("∟ ".encode(), b"_| ")


def until_end(command):
    start = time.perf_counter()
    subprocess.run(command, check=False, stdout=subprocess.DEVNULL, stdin=subprocess.DEVNULL)
    return time.perf_counter() - start


def until_prompt(command, environment):
    start = time.perf_counter()
    pid, terminal = pty.fork()
    if pid == 0:
        os.execvpe(command[0], command, environment)
    seen = b""
    while not any(prompt in seen for prompt in PROMPTS):
        ready, _, _ = select.select([terminal], [], [], 20)
        if not ready:
            raise SystemExit("no prompt after 20 seconds: %r" % seen)
        seen += os.read(terminal, 4096)
    elapsed = time.perf_counter() - start
    os.write(terminal, b"\x04")
    try:
        while os.read(terminal, 4096):
            pass
    except OSError:
        pass
    os.waitpid(pid, 0)
    os.close(terminal)
    return elapsed


def main():
    rounds = int(sys.argv[1]) if len(sys.argv) > 1 else 21
    java_home = Path((IMAGE / "runtime.jdk").read_text().splitlines()[0])
    gnomon = str(IMAGE / "bin" / "gnomon")
    with tempfile.TemporaryDirectory() as scratch:
        folder = Path(scratch)
        (folder / "Hello.java").write_text(HELLO)
        subprocess.run([java_home / "bin" / "javac", "Hello.java"], cwd=folder, check=True)
        one_line = folder / "one.gnomon"
        one_line.write_text("Delta x^3\n")
        environment = dict(os.environ, XDG_STATE_HOME=scratch, TERM="xterm-256color", LANG="C.UTF-8")
        hello = [str(java_home / "bin" / "java"), "-cp", scratch, "Hello"]
        bare, console, run = [], [], []
        for number in range(rounds + 1):
            samples = (
                until_end(hello),
                until_prompt([gnomon], environment),
                until_end([gnomon, "run", str(one_line)]),
            )
            if number > 0:
                for figures, sample in zip((bare, console, run), samples):
                    figures.append(sample)
    base = statistics.median(bare)
    print("JDK %s, %d rounds" % (java_home.name, rounds))
    print("java Hello            %6.1f ms" % (1000 * base))
    for name, figures in (("console to its prompt", console), ("run, one line", run)):
        value = statistics.median(figures)
        print("%-21s %6.1f ms  %.1f times" % (name, 1000 * value, value / base))


if __name__ == "__main__":
    main()
