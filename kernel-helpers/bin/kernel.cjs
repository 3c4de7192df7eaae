#!/usr/bin/env node
"use strict";
import("../dist/notebook/kernel/main.js")
  .then(({ main }) => main(process.argv[2]))
  .catch((error) => {
    process.stderr.write(`${error?.message ?? error}\n`);
    process.exit(1);
  });
