"""Reads a bundle's ZIP with Python's zipfile and its cut list with Python's csv module, as JSON.

The path of the ZIP is the only argument. Both modules are of the standard library, so neither shares a
line with the writers under test.
"""

import csv
import hashlib
import io
import json
import sys
import zipfile

with zipfile.ZipFile(sys.argv[1]) as archive:
    bad = archive.testzip()
    names = archive.namelist()
    files = {name: archive.read(name) for name in names}
    dates = sorted({str(info.date_time) for info in archive.infolist()})

with io.StringIO(files["cut-list.csv"].decode("utf-8-sig"), newline="") as text:
    rows = list(csv.reader(text, strict=True))

json.dump(
    {
        "bad": bad,
        "names": names,
        "dates": dates,
        "digests": {name: hashlib.sha256(data).hexdigest() for name, data in files.items()},
        "rows": rows,
    },
    sys.stdout,
)
