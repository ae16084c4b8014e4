"""The engine: generated straight-line readers and writers, and the walk that explains them."""
