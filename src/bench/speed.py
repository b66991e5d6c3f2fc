#!/usr/bin/env python3
"""The table of speeds: src/jmh beside the yardstick, on this machine, in one run.

    python3 src/bench/speed.py [TASK [LARGEST-N]]

Builds src/bench/yardstick.c (libflint-dev, libgmp-dev, gcc), runs it, then runs the measurements
of src/jmh through Maven's profile "bench", both with the best of five, and prints the ratios as
the table of the README.
"""

import json
import os
import pathlib
import platform
import re
import subprocess
import sys
import datetime

ROOT = pathlib.Path(__file__).resolve().parents[2]
OUT = ROOT / "target" / "bench"

GOALS = {
    "reversionModulo": ("reversion mod a 30-bit prime", {1024: 0.12, 16384: 0.02, 65536: 0.015}),
    "compositionModulo": ("composition mod a 30-bit prime", {1024: 0.08, 16384: 0.02, 65536: 0.012}),
    "reversionOfTimes": (
        "reversion over ℚ of t e^t",
        {20: 5, 50: 2, 100: 1.5, 200: 0.7, 500: 0.15, 1000: 0.06, 2000: 0.03},
    ),
    "reversionOfLess": (
        "reversion over ℚ of e^t − 1",
        {20: 5, 50: 2, 100: 1.5, 200: 0.7, 500: 0.15, 1000: 0.06, 2000: 0.03},
    ),
    "compositionOfExponentials": (
        "composition exp(exp(t) − 1) over ℚ",
        {200: 0.2, 500: 0.06, 1000: 0.03},
    ),
    "exponential": ("exp of a rational series", {500: 1, 2000: 0.6}),
    "logarithm": ("log of a rational series", {500: 1, 2000: 0.6}),
    "bernoulli": ("Bernoulli numbers", {1000: 1.5, 5000: 1.5}),
    "bell": ("Bell numbers", {1000: 1, 5000: 1}),
    "stirlingFirst": ("Stirling row, first kind", {1000: 1, 5000: 1}),
    "stirlingSecond": ("Stirling row, second kind", {1000: 1, 5000: 1}),
    "toFalling": ("monomial → falling, 64-bit coefficients", {1000: 1, 5000: 1}),
    "fromFalling": ("falling → monomial, 64-bit coefficients", {1000: 1, 5000: 1}),
    "product": ("product, 64-bit coefficients", {1000: 1, 100000: 1}),
}


def yardstick(task, largest):
    program = OUT / "yardstick"
    source = ROOT / "src" / "bench" / "yardstick.c"
    subprocess.run(["gcc", "-O2", str(source), "-o", str(program), "-lflint", "-lgmp"], check=True)
    lines = subprocess.run(
        [str(program), task, str(largest)], check=True, capture_output=True, text=True
    ).stdout.split("\n")
    rows = {}
    for line in filter(None, lines):
        name, n, milliseconds = line.split()
        rows[name, int(n)] = float(milliseconds)
    return rows


def measured(task, keys):
    """One run of the benchmarks; with a task given, only for the sizes that the yardstick has."""
    report = OUT / "measured.json"
    pattern = ".*" if task == "all" else f".*{task}.*"
    arguments = f"SpeedOfSeries.{pattern} -rf json -rff {report} -v SILENT"
    if task != "all":
        arguments += " -p n=" + ",".join(str(n) for n in dict.fromkeys(n for _, n in keys))
    subprocess.run(
        [
            "mvn",
            "-q",
            "-Pbench",
            "-Dformat.skip",
            "test-compile",
            "exec:exec@measure",
            f"-Dbench.arguments={arguments}",
        ],
        cwd=ROOT,
        check=True,
    )
    rows = {}
    for result in json.loads(report.read_text()):
        key = result["benchmark"].split(".")[-1], int(result["params"]["n"])
        if key in keys:
            rows[key] = min(min(run) for run in result["primaryMetric"]["rawData"])
    return rows


def machine():
    model = platform.machine()
    if os.path.exists("/proc/cpuinfo"):
        found = re.search(r"model name\s*: (.*)", pathlib.Path("/proc/cpuinfo").read_text())
        model = found.group(1) if found else model
    return f"{model}, {os.cpu_count()} cores, {datetime.date.today().isoformat()}"


def main():
    task = sys.argv[1] if len(sys.argv) > 1 else "all"
    largest = int(sys.argv[2]) if len(sys.argv) > 2 else 1 << 30
    OUT.mkdir(parents=True, exist_ok=True)
    theirs = yardstick(task, largest)
    ours = measured(task, [key for key in theirs if key[1] in GOALS[key[0]][1]])
    print(machine())
    print()
    print("| task | N | gnomon, ms | FLINT 2.9, ms | ratio | goal |")
    print("|---|---|---|---|---|---|")
    for key in ours:
        name, goals = GOALS[key[0]]
        ratio = ours[key] / theirs[key]
        met = "" if ratio <= goals[key[1]] else " (behind)"
        print(
            f"| {name} | {key[1]} | {ours[key]:.3g} | {theirs[key]:.3g} | {ratio:.3g}{met} | ≤ {goals[key[1]]} |"
        )


if __name__ == "__main__":
    main()
