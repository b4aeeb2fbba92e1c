"""Runs notebooks in the kernel that each names: run.py FOLDER NOTEBOOK ...

Writes each with its new outputs into FOLDER, and a line of JSON with its seconds. Needs Debian's nbclient.
"""

import asyncio
import json
import pathlib
import sys
import time

import nbformat
from nbclient import NotebookClient
from nbclient.exceptions import CellExecutionComplete

LATE = 0.1  # seconds in which more outputs may follow
MISSING = 2  # seconds in which the first output may follow


class PatientClient(NotebookClient):
    """Goes on listening for a while after the kernel is idle: Deno's kernel sends some outputs only then."""

    async def _async_poll_output_msg(self, parent_msg_id, cell, cell_index):
        idle = False
        while True:
            patience = None if not idle else LATE if cell["outputs"] else MISSING
            try:
                message = await asyncio.wait_for(self.kc.iopub_channel.get_msg(timeout=None), patience)
            except asyncio.TimeoutError:
                return
            if message["parent_header"].get("msg_id") != parent_msg_id:
                continue
            try:
                self.process_message(message, cell, cell_index)
            except CellExecutionComplete:
                idle = True


if not hasattr(NotebookClient, "_async_poll_output_msg"):
    sys.exit("this nbclient listens in another way: PatientClient does not fit it")
folder, *files = map(pathlib.Path, sys.argv[1:])
for file in files:
    start = time.monotonic()
    notebook = nbformat.read(file, as_version=4)
    place = {"metadata": {"path": str(file.resolve().parent)}}
    PatientClient(notebook, timeout=120, allow_errors=True, resources=place).execute()
    nbformat.write(notebook, folder / file.name)
    print(json.dumps({"file": file.name, "seconds": time.monotonic() - start}), flush=True)
