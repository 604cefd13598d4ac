package io.github.gammawright.algebra;

import edu.jas.arith.BigInteger;
import edu.jas.poly.GenPolynomial;

/** Counts the work of one request against its budget. */
final class WorkMeter {

    private final AlgebraBudget budget;
    private long left;

    WorkMeter(AlgebraBudget budget) {
        this.budget = budget;
        this.left = budget.steps();
    }

    AlgebraBudget budget() {
        return budget;
    }

    /** Takes steps off the budget. */
    void spend(long steps) {
        left -= steps;
        if (left < 0) {
            throw new BudgetExceededException();
        }
    }

    /** Requires that a polynomial is not too large to go on with. */
    GenPolynomial<BigInteger> check(GenPolynomial<BigInteger> polynomial) {
        if (polynomial.length() > budget.terms() || polynomial.totalDegree() > budget.degree()) {
            throw new BudgetExceededException();
        }
        for (BigInteger coefficient : polynomial.getMap().values()) {
            if (coefficient.val.bitLength() > budget.bits()) {
                throw new BudgetExceededException();
            }
        }
        return polynomial;
    }
}
