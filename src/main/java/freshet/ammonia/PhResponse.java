package freshet.ammonia;

/**
 * How toxicity on the basis of total ammonia falls with pH: {@code low/(1 + 10^(middle - pH)) + high/(1 + 10^(pH -
 * middle))}, joint toxicity of the ammonia molecule and the ammonium ion.
 *
 * @param low value towards high pH
 * @param high value towards low pH
 * @param middle pH between the two
 */
record PhResponse(double low, double high, double middle) {

    double at(double ph) {
        return low / (1 + StrictMath.pow(10, middle - ph)) + high / (1 + StrictMath.pow(10, ph - middle));
    }
}
