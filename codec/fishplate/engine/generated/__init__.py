"""Readers and writers written by `fishplate.engine.generate`; never edited by hand."""
