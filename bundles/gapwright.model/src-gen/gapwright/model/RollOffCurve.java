/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Roll Off Curve</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Incremental permeability µ0 + χ/(1 + (|H|/Hhalf)^c), integrated; χ = µ0·(µi − 1).
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.RollOffCurve#getInitialPermeability <em>Initial Permeability</em>}</li>
 *   <li>{@link gapwright.model.RollOffCurve#getHalfFieldStrength <em>Half Field Strength</em>}</li>
 *   <li>{@link gapwright.model.RollOffCurve#getExponent <em>Exponent</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getRollOffCurve()
 * @model
 * @generated
 */
public interface RollOffCurve extends Curve {
	/**
	 * Returns the value of the '<em><b>Initial Permeability</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Relative, above 1.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Initial Permeability</em>' attribute.
	 * @see #setInitialPermeability(double)
	 * @see gapwright.model.GapwrightPackage#getRollOffCurve_InitialPermeability()
	 * @model required="true"
	 * @generated
	 */
	double getInitialPermeability();

	/**
	 * Sets the value of the '{@link gapwright.model.RollOffCurve#getInitialPermeability <em>Initial Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Initial Permeability</em>' attribute.
	 * @see #getInitialPermeability()
	 * @generated
	 */
	void setInitialPermeability(double value);

	/**
	 * Returns the value of the '<em><b>Half Field Strength</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Where the susceptibility has fallen to one half.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Half Field Strength</em>' attribute.
	 * @see #setHalfFieldStrength(Quantity)
	 * @see gapwright.model.GapwrightPackage#getRollOffCurve_HalfFieldStrength()
	 * @model dataType="gapwright.model.FieldStrength" required="true"
	 * @generated
	 */
	Quantity getHalfFieldStrength();

	/**
	 * Sets the value of the '{@link gapwright.model.RollOffCurve#getHalfFieldStrength <em>Half Field Strength</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Half Field Strength</em>' attribute.
	 * @see #getHalfFieldStrength()
	 * @generated
	 */
	void setHalfFieldStrength(Quantity value);

	/**
	 * Returns the value of the '<em><b>Exponent</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * c, above 1.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Exponent</em>' attribute.
	 * @see #setExponent(double)
	 * @see gapwright.model.GapwrightPackage#getRollOffCurve_Exponent()
	 * @model required="true"
	 * @generated
	 */
	double getExponent();

	/**
	 * Sets the value of the '{@link gapwright.model.RollOffCurve#getExponent <em>Exponent</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Exponent</em>' attribute.
	 * @see #getExponent()
	 * @generated
	 */
	void setExponent(double value);

} // RollOffCurve
