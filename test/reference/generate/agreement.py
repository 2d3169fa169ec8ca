"""What every generator here needs: the second route's answers, the comparison of two routes, the file with its head."""

import datetime
import json
import pathlib
import re
import subprocess

from mpmath import mp, mpf

FOLDER = pathlib.Path(__file__).parent
REFERENCE = FOLDER.parent

#: Working digits of the first route. The second route sets its own.
WORKING_DIGITS = 60
#: Two routes must agree to this relative difference, or nothing is written.
TOLERANCE = mpf(10) ** -32
#: Significant digits of a stored value.
STORED_DIGITS = 30

mp.dps = WORKING_DIGITS


def pari(program, definitions=""):
    """Runs `program` (a file beside this one) in PARI/GP after `definitions`; returns the printed lines."""
    text = f'{definitions}\nread("{program}");\n'
    run = subprocess.run(["gp", "-q", "-f", "--default", "parisizemax=1G"], input=text, capture_output=True,
                         text=True, cwd=FOLDER / "second_route", check=True)
    if "***" in run.stdout + run.stderr:
        raise RuntimeError(f"{program}: {run.stdout[-2000:]}{run.stderr[-2000:]}")
    return run.stdout.replace(" e", "e").splitlines()


def difference(first, second):
    """Symmetric relative difference; 0 for two zeros, infinity if only one of the two exists."""
    if first is None or second is None:
        return mpf(0) if first is second else mp.inf
    largest = max(abs(first), abs(second))
    return abs(first - second) / largest if largest else mpf(0)


def decimal(value, digits=STORED_DIGITS):
    """The stored form: a string with that many significant digits, or null."""
    if value is None or isinstance(value, str):
        return value
    return mp.nstr(value, digits, strip_zeros=False, min_fixed=-4, max_fixed=12) if value else "0"


def write(path, provenance, body):
    """Writes one reference file, provenance first, one row of a list of rows per line."""
    head = {"digits": STORED_DIGITS, **provenance, "generated": datetime.date.today().isoformat()}
    path.parent.mkdir(exist_ok=True)
    text = json.dumps({"provenance": head, **body}, indent=1, ensure_ascii=False)
    short_lists = re.sub(r"\[\n\s+(\"[^\[\]{}]*?)\n\s+\]", lambda m: "[" + " ".join(m[1].split()) + "]", text)
    path.write_text((short_lists if body.get("columns") else text) + "\n")
