"""The keeper's parameter sets and redshift grids, numbers as written."""

from decimal import Decimal

import yaml

from agreement import REFERENCE

CONTENT = REFERENCE.parents[1] / "content"


def read(folder):
    """{id: mapping of strings} of the YAML files in one content folder."""
    return {file.stem: yaml.load(file.read_text(), yaml.BaseLoader) for file in sorted((CONTENT / folder).glob("*.yaml"))}


def parameter_sets():
    """{id: parameters as in models.json}"""
    return {name: {key: given["value"] if isinstance(given, dict) else given for key, given in found["parameters"].items()}
            for name, found in read("parameter-sets").items()}


def steps(segment):
    start, end, step = (Decimal(segment[key]) for key in ("from", "to", "step"))
    return [start + k * step for k in range(int((end - start) / step) + 1)]


def redshift_grids():
    """{id: redshifts as exact decimals in ascending order}"""
    return {name: [str(z) for z in sorted({z: None for segment in found.get("segments", []) for z in steps(segment)}
                                          | {Decimal(z): None for z in found.get("values", [])})]
            for name, found in read("redshift-grids").items()}
