//! Numbers without meaning: no domain words in here.
