import { defineConfig } from "eslint/config";
import tseslint from "typescript-eslint";

export default defineConfig(
  { ignores: ["target/", "node_modules/"] },
  {
    extends: [tseslint.configs.strictTypeChecked, tseslint.configs.stylisticTypeChecked],
    languageOptions: { parserOptions: { projectService: true } },
    rules: {
      eqeqeq: "error",
      "max-lines": ["error", 300],
      "max-lines-per-function": ["error", 60],
      "@typescript-eslint/restrict-template-expressions": ["error", { allowNumber: true }],
    },
  },
  {
    files: ["src/**/*.ts"],
    rules: { "@typescript-eslint/explicit-module-boundary-types": "error" },
  },
  {
    // Their types stand in comments, which this rule does not see.
    files: ["scripts/**/*.mjs"],
    rules: { "@typescript-eslint/no-unsafe-return": "off" },
  },
  {
    // node:test's describe and test give promises that the runner awaits.
    files: ["test/**/*.ts", "workbench/**/*.ts"],
    rules: {
      "max-lines-per-function": "off",
      "@typescript-eslint/no-floating-promises": [
        "error",
        {
          allowForKnownSafeCalls: [
            { from: "package", name: ["test", "describe"], package: "node:test" },
          ],
        },
      ],
    },
  },
);
