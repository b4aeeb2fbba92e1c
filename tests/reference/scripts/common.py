# What the generators share: where their tables go, how numbers are written, and who made them.
import importlib
import json
import os
import platform

HERE = os.path.dirname(os.path.abspath(__file__))


def made_by(script, method, *packages):
    """The provenance of a table."""
    versions = {name: importlib.import_module(name).__version__ for name in packages}
    return {"script": os.path.basename(script), "python": platform.python_version(), **versions, "method": method}


def save(name, document):
    """Writes a table; the project's formatter sets its line breaks."""
    path = os.path.join(HERE, "..", "computed", name + ".json")
    with open(path, "w", encoding="utf-8") as file:
        json.dump(document, file, indent=2, ensure_ascii=False)
        file.write("\n")
    print("wrote", os.path.relpath(path))
