import { expect, test } from "vitest";
import { bucketHours } from "@/lib/pay/bucket-hours";

test("bucketHours adds up, ties to double, then overtime, then regular", () => {
  // each is 0.005 h over a hundredth, 0.015 h together: one hundredth too few to go round
  expect(bucketHours({ regular: 3618, overtime: 3618, double: 3618 })).toEqual({
    total: "3.02",
    double: "1.01",
    overtime: "1.01",
    regular: "1.00",
  });
  expect(bucketHours({ regular: 0, overtime: 0, double: 0 }).total).toBe("0.00");
});
