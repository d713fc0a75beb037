"""Whole processes side by side: the command of this program, and the same fit with SciPy, alternating.

Run from the top of the repository after "mvn package":   python3 docs/whole-process.py [repeats] [rows of the long log]
Prints medians of the wall time and their ratio, and for an invented log of a million rows wall time and largest resident size.
"""
import os, resource, statistics, subprocess, sys, tempfile, time

FIT = '''
import numpy as np
from scipy.optimize import curve_fit
rows = [l.split(",") for l in open("sample-runs/01-both-faces.csv") if l[0].isdigit()]
t = np.array([float(r[0]) for r in rows]) * 3600
y = (np.array([float(r[1]) for r in rows]) - 31.2041) / 31.2041 * 100
m = np.arange(1, 60, 2)[:, None]
def G(tau):
    return 1 - (8 / (m * m * np.pi ** 2) * np.exp(-m * m * np.pi ** 2 * tau / 4)).sum(0)
def curve(t, lnD, level, start):
    return start + (level - start) * G(np.exp(lnD) * t / 1.015e-3 ** 2)
p, c = curve_fit(curve, t, y, p0=[np.log(1e-12), y[-1], y[0]])
print(np.exp(p[0]), np.exp(p[0]) * c[0, 0] ** 0.5, p[1:], np.sqrt(np.diag(c))[1:])
'''

def timed(command):
    start = time.perf_counter()
    subprocess.run(command, stdout=subprocess.DEVNULL, stderr=subprocess.DEVNULL, check=True)
    return time.perf_counter() - start

def main():
    repeats = int(sys.argv[1]) if len(sys.argv) > 1 else 15
    rows = int(sys.argv[2]) if len(sys.argv) > 2 else 1_000_000
    program = ["java", "-jar", "target/soakline.jar", "estimate"]
    with tempfile.TemporaryDirectory() as folder:
        fit = os.path.join(folder, "fit.py")
        open(fit, "w").write(FIT)
        ours, theirs, bare = [], [], []
        for _ in range(repeats):
            ours.append(timed(program + ["sample-runs/01-both-faces.csv"]))
            theirs.append(timed([sys.executable, fit]))
            bare.append(timed(["java", "-version"]))
        a, b, c = map(statistics.median, (ours, theirs, bare))
        print(f"estimate of 40 rows {a:.3f} s, the same fit with SciPy {b:.3f} s, ratio {a / b:.2f}; java -version {c:.3f} s")
        for kind in ("hours", "dates"):
            log = os.path.join(folder, kind + ".csv")
            subprocess.run(["java", "-cp", "target/test-classes" + os.pathsep + "target/classes" + os.pathsep + "target/soakline.jar",
                            "soakline.bench.LongLog", log, str(rows), kind], check=True)
            times = [timed(program + [log]) for _ in range(5)]
            start = resource.getrusage(resource.RUSAGE_CHILDREN).ru_maxrss
            print(f"{rows} rows, {kind}: {statistics.median(times):.2f} s; largest resident size so far {start / 1024:.0f} MiB")

main()
