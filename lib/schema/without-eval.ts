import { z } from "zod";

// Pages forbid code made from text; zod would try it once, and each page would report the refusal.
if (typeof document !== "undefined") z.config({ jitless: true });
