import { defineConfig } from "vitest/config";

// `pure` runs the TypeScript sources and is not isolated (300 isolated files take ten times as long);
// `built` runs what is in dist: workers, kernel, command line, PDF.
export default defineConfig({
  test: {
    projects: [
      {
        test: {
          name: "pure",
          include: ["test/**/*.test.ts"],
          exclude: ["test/built/**"],
          isolate: false,
          pool: "threads",
          sequence: { groupOrder: 0 },
        },
      },
      {
        test: {
          name: "built",
          include: ["test/built/**/*.test.ts"],
          pool: "forks",
          fileParallelism: false,
          testTimeout: 120_000,
          hookTimeout: 120_000,
          sequence: { groupOrder: 1 },
        },
      },
    ],
  },
});
