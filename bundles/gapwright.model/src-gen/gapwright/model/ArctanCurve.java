/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Arctan Curve</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * B = µ0·H + (2·Js/π)·atan(π·χ·H/(2·Js)), χ = µ0·(µi − 1).
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.ArctanCurve#getInitialPermeability <em>Initial Permeability</em>}</li>
 *   <li>{@link gapwright.model.ArctanCurve#getSaturationPolarisation <em>Saturation Polarisation</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getArctanCurve()
 * @model
 * @generated
 */
public interface ArctanCurve extends Curve {
	/**
	 * Returns the value of the '<em><b>Initial Permeability</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Relative, above 1.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Initial Permeability</em>' attribute.
	 * @see #setInitialPermeability(double)
	 * @see gapwright.model.GapwrightPackage#getArctanCurve_InitialPermeability()
	 * @model required="true"
	 * @generated
	 */
	double getInitialPermeability();

	/**
	 * Sets the value of the '{@link gapwright.model.ArctanCurve#getInitialPermeability <em>Initial Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Initial Permeability</em>' attribute.
	 * @see #getInitialPermeability()
	 * @generated
	 */
	void setInitialPermeability(double value);

	/**
	 * Returns the value of the '<em><b>Saturation Polarisation</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What the polarisation tends to.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Saturation Polarisation</em>' attribute.
	 * @see #setSaturationPolarisation(Quantity)
	 * @see gapwright.model.GapwrightPackage#getArctanCurve_SaturationPolarisation()
	 * @model dataType="gapwright.model.FluxDensity" required="true"
	 * @generated
	 */
	Quantity getSaturationPolarisation();

	/**
	 * Sets the value of the '{@link gapwright.model.ArctanCurve#getSaturationPolarisation <em>Saturation Polarisation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Saturation Polarisation</em>' attribute.
	 * @see #getSaturationPolarisation()
	 * @generated
	 */
	void setSaturationPolarisation(Quantity value);

} // ArctanCurve
