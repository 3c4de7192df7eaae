import tseslint from "typescript-eslint";

export default tseslint.config(
  {
    ignores: [
      "**/dist/**",
      "**/node_modules/**",
      "out/**",
      "kernel-helpers/vendor/**",
      "notebooks/**",
      "test/types/**",
    ],
  },
  ...tseslint.configs.strictTypeChecked.map((c) => ({ ...c, files: ["**/*.ts"] })),
  {
    files: ["**/*.ts"],
    languageOptions: {
      parserOptions: {
        project: ["./kernel-helpers/tsconfig.json", "./test/tsconfig.json"],
        tsconfigRootDir: import.meta.dirname,
      },
    },
    rules: {
      "@typescript-eslint/restrict-template-expressions": ["error", { allowNumber: true }],
      "@typescript-eslint/no-unused-vars": [
        "error",
        { argsIgnorePattern: "^_", varsIgnorePattern: "^_" },
      ],
      "@typescript-eslint/no-confusing-void-expression": [
        "error",
        { ignoreVoidOperator: true, ignoreArrowShorthand: true },
      ],
      "@typescript-eslint/no-unnecessary-type-parameters": "off",
      "@typescript-eslint/no-meaningless-void-operator": "off",
      "@typescript-eslint/no-unused-expressions": ["error", { allowTaggedTemplates: true }],
    },
  },
  {
    // A spread costs several hundred times the call of a method.
    files: ["kernel-helpers/models/**/*.ts", "kernel-helpers/physics/**/*.ts"],
    rules: {
      "no-restricted-syntax": [
        "error",
        {
          selector: "CallExpression > ObjectExpression > SpreadElement",
          message: "no spread in a solver: name each argument",
        },
      ],
    },
  },
);
