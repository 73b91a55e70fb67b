import js from "@eslint/js";
import globals from "globals";
import tseslint from "typescript-eslint";

/** Blocks of cells come from the host as any[][]: the platform's metadata reader takes no other type. */
const CELLS = { "@typescript-eslint/no-explicit-any": "off" };

export default tseslint.config(
  { ignores: ["**/node_modules/**", "**/dist/**", "**/coverage/**"] },
  js.configs.recommended,
  ...tseslint.configs.recommended,
  {
    rules: {
      eqeqeq: ["error", "always", { null: "ignore" }],
      "no-console": ["error", { allow: ["debug"] }],
      // Figures stand as printed, also where a double cannot hold every digit.
      "no-loss-of-precision": "off",
      "no-eval": "error",
      "no-implied-eval": "error",
      "no-new-func": "error",
      "no-var": "error",
      "prefer-const": "error",
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_", varsIgnorePattern: "^_" }],
    },
  },
  { files: ["src/functions/**/*.ts"], rules: CELLS },
  { files: ["tests/**/*.ts", "tests/**/*.mjs"], rules: { ...CELLS, "no-console": "off" } },
  { files: ["**/*.mjs", "**/*.js"], languageOptions: { globals: globals.node } },
  { files: ["**/*.js"], rules: { "@typescript-eslint/no-require-imports": "off" } },
);
