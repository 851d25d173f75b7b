/**
 */
package gapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Linear Curve</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * B = µ0·µr·H.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.LinearCurve#getRelativePermeability <em>Relative Permeability</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getLinearCurve()
 * @model
 * @generated
 */
public interface LinearCurve extends Curve {
	/**
	 * Returns the value of the '<em><b>Relative Permeability</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * 1 or more.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Relative Permeability</em>' attribute.
	 * @see #setRelativePermeability(double)
	 * @see gapwright.model.GapwrightPackage#getLinearCurve_RelativePermeability()
	 * @model required="true"
	 * @generated
	 */
	double getRelativePermeability();

	/**
	 * Sets the value of the '{@link gapwright.model.LinearCurve#getRelativePermeability <em>Relative Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Relative Permeability</em>' attribute.
	 * @see #getRelativePermeability()
	 * @generated
	 */
	void setRelativePermeability(double value);

} // LinearCurve
