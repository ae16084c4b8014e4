"""Settings of the documentation build: ``sphinx-build -W docs docs/_build``."""

from __future__ import annotations

import fishplate

project = "fishplate"
author = "the fishplate authors"
release = version = fishplate.__version__
language = "en_GB"

extensions = ["myst_parser", "sphinx.ext.autodoc"]
autodoc_typehints = "none"  # signatures stay readable; the words are in the docstrings
autodoc_member_order = "bysource"
myst_enable_extensions = ["colon_fence", "deflist"]
myst_heading_anchors = 3
exclude_patterns = ["_build"]
nitpicky = True

html_theme = "alabaster"
html_theme_options = {
    "description": "ERTMS/ETCS packets, telegrams and messages, bit for bit",
    "page_width": "70rem",
    "fixed_sidebar": True,
}
