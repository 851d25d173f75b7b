/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Current Drive</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * An imposed current with a ripple about it.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.CurrentDrive#getCurrent <em>Current</em>}</li>
 *   <li>{@link gapwright.model.CurrentDrive#getRipple <em>Ripple</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getCurrentDrive()
 * @model
 * @generated
 */
public interface CurrentDrive extends Drive {
	/**
	 * Returns the value of the '<em><b>Current</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Mean.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Current</em>' attribute.
	 * @see #setCurrent(Quantity)
	 * @see gapwright.model.GapwrightPackage#getCurrentDrive_Current()
	 * @model dataType="gapwright.model.Current" required="true"
	 * @generated
	 */
	Quantity getCurrent();

	/**
	 * Sets the value of the '{@link gapwright.model.CurrentDrive#getCurrent <em>Current</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Current</em>' attribute.
	 * @see #getCurrent()
	 * @generated
	 */
	void setCurrent(Quantity value);

	/**
	 * Returns the value of the '<em><b>Ripple</b></em>' attribute.
	 * The default value is <code>"0 A"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Peak to peak.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Ripple</em>' attribute.
	 * @see #setRipple(Quantity)
	 * @see gapwright.model.GapwrightPackage#getCurrentDrive_Ripple()
	 * @model default="0 A" dataType="gapwright.model.Current"
	 * @generated
	 */
	Quantity getRipple();

	/**
	 * Sets the value of the '{@link gapwright.model.CurrentDrive#getRipple <em>Ripple</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Ripple</em>' attribute.
	 * @see #getRipple()
	 * @generated
	 */
	void setRipple(Quantity value);

} // CurrentDrive
