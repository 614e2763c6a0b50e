"""Runs the code of several notebooks in one process, each by itself.

Arguments: files of Python. For each a line: its name, "ended" or "failed", and the error.
"""
import contextlib
import io
import sys

sys.modules["IPython"] = None  # as where there is none
for name in sys.argv[1:]:
    printed = io.StringIO()
    try:
        with open(name, encoding="utf-8") as file, contextlib.redirect_stdout(printed):
            exec(compile(file.read(), name, "exec"), {"__name__": "__main__"})
        print(name, "ended", len(printed.getvalue().splitlines()), flush=True)
    except Exception as error:
        print(name, "failed", type(error).__name__, str(error).replace("\n", " "), flush=True)
