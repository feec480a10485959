"""Rewrites the labelled corpus: `/usr/bin/python3 scripts/corpus/make.py [--only topic] [--cache file]`.

`--cache` keeps SymPy's proofs between runs; without it every proof is made anew (a minute or two).
"""

import argparse
import importlib
import pkgutil
import sys
import time
from collections import Counter
from os.path import dirname, join

sys.path.insert(0, dirname(__file__))
sys.path.insert(0, join(dirname(__file__), "topics"))

from emit import load_proofs, save_proofs


def main():
    args = argparse.ArgumentParser()
    args.add_argument("--only", default="")
    args.add_argument("--cache", default="")
    chosen = args.parse_args()
    load_proofs(chosen.cache)
    total, doubts = Counter(), []
    for module in sorted(m.name for m in pkgutil.iter_modules([join(dirname(__file__), "topics")])):
        if chosen.only and chosen.only not in module:
            continue
        started = time.time()
        for topic in importlib.import_module(module).topics():
            counts = topic.write()
            total += counts
            doubts += topic.doubts
            print(f"{topic.name:28} {dict(counts)}  {time.time() - started:.1f} s", flush=True)
            save_proofs(chosen.cache)
    print(f"all: {dict(total)}")
    for text in doubts:
        print("NOT WRITTEN", text)
    return 1 if doubts else 0


if __name__ == "__main__":
    sys.exit(main())
